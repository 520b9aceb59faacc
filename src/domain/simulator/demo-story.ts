import { DEMO_DAYS, DEMO_TIME_ZONE } from "./demo-calendar";
import { DEMO_CONVERSATION, type DemoComment } from "./demo-conversation";
import { DEMO_DIARY, DEMO_FLAGS, type DemoEntry, type DemoFlag } from "./demo-diary";
import { demoEntries, demoRows, type DemoRow } from "./demo-entries";
import { DEMO_BACKGROUND, DEMO_PEOPLE } from "./demo-people";
import { demoSeries } from "./demo-series";
import { DEMO_VERSIONS, type DemoVersion } from "./demo-versions";

/**
 * The demo, whole: invented people, 32 days from day 1 on the new setup, what was set,
 * logged, flagged and said, and what sensor and pump recorded.
 *
 * @property rows every five minutes since the start; `entries` in order of time, meals and doses included
 */
export type DemoStory = Readonly<{
  timeZone: string;
  days: number;
  people: typeof DEMO_PEOPLE;
  background: typeof DEMO_BACKGROUND;
  versions: ReadonlyArray<DemoVersion>;
  flags: ReadonlyArray<DemoFlag>;
  comments: ReadonlyArray<DemoComment>;
  entries: ReadonlyArray<DemoEntry>;
  rows: ReadonlyArray<DemoRow>;
}>;

/**
 * Tells the demo of content.md 13. Moments are a day of the story and minutes of the
 * wall clock in `timeZone`; a seeder sets day 1 where it wants. Where the clock is put
 * forward some minutes do not exist and their rows are to be left out.
 *
 * Always the same: its chance comes from a fixed seed.
 */
export function demoStory(): DemoStory {
  const series = demoSeries();
  return {
    timeZone: DEMO_TIME_ZONE,
    days: DEMO_DAYS,
    people: DEMO_PEOPLE,
    background: DEMO_BACKGROUND,
    versions: DEMO_VERSIONS,
    flags: DEMO_FLAGS,
    comments: DEMO_CONVERSATION,
    entries: [...DEMO_DIARY, ...demoEntries(series)].toSorted((a, b) => a.day - b.day || a.minute - b.minute),
    rows: demoRows(series),
  };
}
