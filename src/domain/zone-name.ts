/** Whether this is a name of the IANA zone list that this platform knows. */
export function isZone(name: string): boolean {
  try {
    new Intl.DateTimeFormat("en", { timeZone: name });
    return /^[A-Za-z]/.test(name);
  } catch {
    return false;
  }
}

/** The zones to choose from, UTC first; the platform's own list leaves it out. */
export function zoneNames(): string[] {
  return ["UTC", ...Intl.supportedValuesOf("timeZone").filter((zone) => zone !== "UTC")];
}
