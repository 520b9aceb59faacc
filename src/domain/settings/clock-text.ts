/** A minute of the day on the clock: 300 is "05:00", 1440 is "24:00". */
export function clockText(minute: number): string {
  const hours = String(Math.floor(minute / 60)).padStart(2, "0");
  const minutes = String(minute % 60).padStart(2, "0");
  return `${hours}:${minutes}`;
}
