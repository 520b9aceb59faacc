/** What a flag does to the days it covers when versions are compared. */
export type FlagEffect = "leave-out" | "leave-out-segment" | "tag";

type DayFlag = Readonly<{
  label: string;
  effect: FlagEffect;
  /** Days before the first flagged one that are left out with it. */
  daysBefore: number;
  /** Days after the last flagged one that are left out with it. */
  daysAfter: number;
  /** The usual direction of glucose, and whence that is known. */
  usual: string;
}>;

const leaveOut = (label: string, usual: string, daysBefore = 0, daysAfter = 0): DayFlag => ({
  label, effect: "leave-out", daysBefore, daysAfter, usual,
});
const tag = (label: string, usual = "varies"): DayFlag => ({
  label, effect: "tag", daysBefore: 0, daysAfter: 0, usual,
});

/** The coded list of day flags. Directions as read in hospital leaflets and papers; "varies" is common practice, no source. */
export const DAY_FLAGS = {
  "illness-fever": leaveOut("Feverish illness", "up", 1),
  "illness-stomach": leaveOut("Stomach upset", "down"),
  steroid: leaveOut("Steroid", "up"),
  "site-failure": leaveOut("Site failure", "up"),
  "sensor-fault": leaveOut("Sensor fault", "false values"),
  "pressure-low": { label: "Lay on the sensor", effect: "leave-out-segment", daysBefore: 0, daysAfter: 0, usual: "false low" },
  "automation-off": leaveOut("Automation off", "varies"),
  "travel-zone": leaveOut("Time zone change", "clock shift", 0, 1),
  "fasting-day": tag("Fasting day", "down late, up after"),
  alcohol: tag("Alcohol", "early up, later down"),
  "hard-exercise": tag("Hard exercise", "up early"),
  "long-exercise": tag("Long exercise", "down, into the next night"),
  "cycle-late": tag("Late cycle", "up"),
  "short-sleep": tag("Short sleep", "up"),
  stress: tag("Stress", "usually up"),
  heat: tag("Heat"),
  "new-medicine": tag("New medicine"),
  "new-insulin": tag("New insulin"),
  "first-sensor-day": tag("First day of a sensor", "less accurate"),
} as const satisfies Record<string, DayFlag>;

export type DayFlagCode = keyof typeof DAY_FLAGS;

/** How many days beyond its own ends a flag may leave out, at most: how far around a span to look for flags. */
export const FLAG_REACH_DAYS = Math.max(...Object.values<DayFlag>(DAY_FLAGS).flatMap(({ daysBefore, daysAfter }) => [daysBefore, daysAfter]));

export const DAY_FLAG_CODES = Object.keys(DAY_FLAGS) as DayFlagCode[];

/**
 * The civil days that a flag leaves out of a comparison.
 *
 * @param flag first and last flagged day, as days since 1970-01-01
 * @returns day numbers, ascending; empty for a flag that only tags
 */
export function daysLeftOut(flag: Readonly<{ code: DayFlagCode; firstDay: number; lastDay: number }>): number[] {
  const rule: DayFlag = DAY_FLAGS[flag.code];
  if (rule.effect !== "leave-out") return [];
  const first = flag.firstDay - rule.daysBefore;
  const count = flag.lastDay + rule.daysAfter - first + 1;
  return Array.from({ length: Math.max(0, count) }, (_, i) => first + i);
}
