import type { DigestLevel } from "./basis";

/** What a reader chose about mail from their journals. */
export type DigestPreference = Readonly<{
  level: DigestLevel;
  /** 1 Monday … 7 Sunday, in the reader's own zone. */
  weekday: number;
  minuteOfDay: number;
  isToldOfComments: boolean;
}>;

/** Before anything was chosen: counts and links, Monday at eight. */
export const DEFAULT_DIGEST_PREFERENCE: DigestPreference = {
  level: "links",
  weekday: 1,
  minuteOfDay: 8 * 60,
  isToldOfComments: true,
};

export const WEEKDAYS = ["Monday", "Tuesday", "Wednesday", "Thursday", "Friday", "Saturday", "Sunday"] as const;
