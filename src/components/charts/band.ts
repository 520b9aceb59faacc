/** The middle half of readings around one minute of the day, in the shown unit. */
export type Band = Readonly<{ minute: number; p25: number; p50: number; p75: number }>;
