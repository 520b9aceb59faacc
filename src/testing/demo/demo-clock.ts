import { addDays } from "@/domain/day-start";
import { instantsOfLocal } from "@/domain/exchange/csv/local-times";
import { clockText } from "@/domain/settings/clock-text";
import type { DemoMoment } from "@/domain/simulator/demo-calendar";

export type DemoClock = (moment: DemoMoment) => Date;

/** The instant of a moment of the story; a minute that the clock skips becomes the one an hour on. */
export function demoClock(dayOne: string, zone: string): DemoClock {
  return ({ day, minute }) => {
    const local = Date.parse(`${addDays(dayOne, day - 1)}T${clockText(minute)}:00Z`);
    const [first = instantsOfLocal(local + 3_600_000, zone)[0] ?? local] = instantsOfLocal(local, zone);
    return new Date(first);
  };
}
