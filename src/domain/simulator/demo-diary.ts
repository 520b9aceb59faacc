import type { DayFlagCode } from "@/domain/journal/day-flag";
import type { EntryData } from "@/domain/journal/entry";
import { DEMO_FEVER, DEMO_MISSED_DOSE_DAY, DEMO_PRESSURE, type DemoMoment } from "./demo-calendar";

/** Something the demo's person wrote down. */
export type DemoEntry = DemoMoment & Readonly<{ data: EntryData }>;

/** A flag on days of the story; set before the graph of those days was looked at, or after. */
export type DemoFlag = Readonly<{
  code: DayFlagCode; firstDay: number; lastDay: number; strength: number; note: string; isGraphSeen: boolean; setAt: DemoMoment;
}>;

export const DEMO_FLAGS: ReadonlyArray<DemoFlag> = [
  { code: "illness-fever", firstDay: DEMO_FEVER.firstDay, lastDay: DEMO_FEVER.lastDay, strength: 2, note: "38.6 in the morning. Half the bakery has it.", isGraphSeen: false, setAt: { day: 15, minute: 450 } },
  { code: "short-sleep", firstDay: 12, lastDay: 12, strength: 1, note: "Early batch for the market.", isGraphSeen: false, setAt: { day: 12, minute: 1210 } },
  { code: "pressure-low", firstDay: DEMO_PRESSURE.day, lastDay: DEMO_PRESSURE.day, strength: 1, note: "Woke up lying on the arm with the sensor. It read far too low for an hour.", isGraphSeen: true, setAt: { day: DEMO_PRESSURE.day, minute: 405 } },
];

const note = (day: number, minute: number, text: string): DemoEntry => ({ day, minute, data: { kind: "note", text } });

const NOTES: ReadonlyArray<DemoEntry> = [
  note(1, 1260, "First day. Looked at the screen about a hundred times. Nothing happened, which is what everyone told me."),
  note(2, 1245, "Marguerite rang. Urge to change something: strong. Wrote it down instead."),
  note(3, 1230, "First set change on my own. It sat straight."),
  note(5, 1220, "Breakfast, again. Steep until the second tray is out."),
  note(6, 400, "Changed the morning ratio. One thing only."),
  note(8, 1305, "Came back: two at once. Fair. I pick the night."),
  note(11, 380, "Slept through and woke up level."),
  note(12, 1200, "Up at three for the market. Tired, but the numbers kept calm."),
  note(15, 470, "Fever. Ketones looked at, plan on the fridge door."),
  note(16, 1215, "Fever gone by the afternoon. Sleep."),
  note(18, 1225, "Back at the oven. Corrections at noon are slow."),
  note(21, 905, "Low between the ovens, the second this week. Juice from the shelf."),
  note(23, 1165, "Three afternoons with a low since the change. My rule says back, so back it goes."),
  note(25, 1240, "Quiet day. Signe says I talk about other things again."),
  note(DEMO_MISSED_DOSE_DAY, 1300, "Dinner with the whole family and I forgot the dose. Found out at half past nine."),
  note(DEMO_PRESSURE.day, 410, "Alarm at half past two, finger said 158. I had been lying on it."),
  note(31, 1235, "Sent the breakfast ratio to Marguerite. This time with four days of reasons."),
];

const feeling = (day: number, wornOutToFresh: number, worriedToAtEase: number): DemoEntry => ({
  day, minute: 1270, data: { kind: "feeling", wornOutToFresh, worriedToAtEase },
});

/** Day, worn out to fresh, worried to at ease; some evenings she had other things to do. */
const FEELINGS = [
  [1, 6, 3], [2, 5, 3], [3, 5, 4], [4, 6, 5], [5, 5, 5], [6, 6, 5], [7, 4, 4], [8, 5, 4], [9, 6, 5], [10, 6, 6],
  [11, 7, 7], [12, 3, 6], [13, 6, 7], [14, 5, 6], [15, 2, 4], [16, 3, 5], [18, 6, 7], [19, 6, 6], [20, 5, 5], [21, 4, 3],
  [22, 4, 3], [23, 5, 5], [25, 7, 7], [26, 7, 8], [27, 5, 5], [28, 6, 7], [29, 5, 7], [30, 7, 8], [31, 7, 8],
] as const;

const site = (day: number): DemoEntry => ({ day, minute: 1000, data: { kind: "site", event: "changed" } });
const sensor = (day: number): DemoEntry => ({ day, minute: 1010, data: { kind: "sensor", event: "new" } });

/** Everything written by hand; meals and doses come with the simulated series. */
export const DEMO_DIARY: ReadonlyArray<DemoEntry> = [
  ...NOTES,
  ...FEELINGS.map(([day, fresh, atEase]) => feeling(day, fresh, atEase)),
  ...[3, 6, 9, 12, 15, 18, 21, 24, 27, 30].map(site),
  ...[1, 11, 21, 31].map(sensor),
  { day: 15, minute: 480, data: { kind: "ketones", ketonesMicroMolPerL: 400 } },
  { day: 16, minute: 500, data: { kind: "ketones", ketonesMicroMolPerL: 200 } },
  { day: 25, minute: 1020, data: { kind: "activity", level: "easy", durationMinutes: 40, isPlanned: true } },
  { day: DEMO_PRESSURE.day, minute: DEMO_PRESSURE.fromMinute, data: { kind: "sensor", event: "lay-on-it" } },
].toSorted((a, b) => a.day - b.day || a.minute - b.minute) as ReadonlyArray<DemoEntry>;
