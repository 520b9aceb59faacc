import { SLOT_MINUTES, SLOTS_PER_DAY } from "./slots";

/**
 * The days of the demo, counted from day 1, the first on the new setup (content.md 13).
 * Where the demo is placed on the calendar is for its seeder to say; nothing here
 * depends on it, days off included.
 *
 * A change needs three usable days before the day that precedes it and three after it
 * to be compared at all. That is why the second version begins on day 6 and the
 * undoing on day 23.
 */
export const DEMO_DAYS = 32;

export const DEMO_TIME_ZONE = "Europe/Oslo";

/** A moment of the story: its day, and minutes after midnight of the wall clock there. */
export type DemoMoment = Readonly<{ day: number; minute: number }>;

/** When each version went into effect. Version 1 is switched on in the morning of day 1; there is nothing before. */
export const DEMO_EFFECTIVE = {
  version1: { day: 1, minute: 390 },
  version2: { day: 6, minute: 380 },
  version3: { day: 10, minute: 1230 },
  version4: { day: 19, minute: 705 },
  version5: { day: 23, minute: 1160 },
} as const satisfies Record<string, DemoMoment>;

/** Two days of fever: flagged from the first to the last, felt from the early hours of one to the afternoon of the other. */
export const DEMO_FEVER = {
  firstDay: 15,
  lastDay: 16,
  begins: { day: 15, minute: 150 },
  ends: { day: 16, minute: 960 },
} as const;

/** The evening on which the dose for dinner was forgotten. */
export const DEMO_MISSED_DOSE_DAY = 27;

/** The night on the sensor: minutes of the day between which it read too low. */
export const DEMO_PRESSURE = { day: 29, fromMinute: 135, toMinute: 205 } as const;

/** The bakery is closed on two days in seven. */
export function isDemoDayOff(day: number): boolean {
  return day % 7 === 0 || day % 7 === 6;
}

/** The first slot at or after a moment, counted from midnight of day 1. */
export function slotOfMoment({ day, minute }: DemoMoment): number {
  return (day - 1) * SLOTS_PER_DAY + Math.ceil(minute / SLOT_MINUTES);
}

export function momentOfSlot(slot: number): DemoMoment {
  return { day: Math.floor(slot / SLOTS_PER_DAY) + 1, minute: (slot % SLOTS_PER_DAY) * SLOT_MINUTES };
}

/** Whether the new setup is running at a slot. */
export function hasBegun(slot: number): boolean {
  return slot >= slotOfMoment(DEMO_EFFECTIVE.version1);
}
