type Task = Readonly<{ what: string; who: "person" | "educator" | "circle"; source: string }>;
export type Phase = Readonly<{ name: string; firstDay: number; lastDay: number; tasks: ReadonlyArray<Task> }>;

const CP = "common practice, no source";

/** The plan; day 1 is the first day on the new setup. Lists are data: a clinic may change every one. */
export const PLAN: ReadonlyArray<Phase> = [
  {
    name: "Prepare", firstDay: -21, lastDay: 0,
    tasks: [
      { what: "Write down every setting or dose of the present setup, 7 to 14 days of it", who: "person", source: "pump workbooks and workspace sheets" },
      { what: "Bring in 14 days of glucose", who: "person", source: "international consensus on time in range, 2019" },
      { what: "Go through the starting profile and ask for a review", who: "person", source: CP },
      { what: "Back-up doses and sick-day plan in hand", who: "educator", source: "UK, Canadian and Australian pump leaflets" },
      { what: "Training on the device done, a set change watched", who: "educator", source: "pump start-up guidance, rev. 2025" },
      { what: "Kit packed; two people who can be called", who: "person", source: CP },
    ],
  },
  {
    name: "Start day", firstDay: 1, lastDay: 1,
    tasks: [
      { what: "Enter the settings on the device, then have them read back", who: "circle", source: CP },
      { what: "Look at glucose before bed and once in the night, about 03:00", who: "person", source: "pump start-up guidance, rev. 2025" },
    ],
  },
  {
    name: "Watch", firstDay: 1, lastDay: 3,
    tasks: [
      { what: "Change nothing unless lows or ketones ask for it", who: "person", source: "children’s hospital dose-adjustment guide" },
      { what: "A call within one to two days", who: "educator", source: "composite of published follow-ups" },
      { what: "First set change", who: "person", source: "pump programme article" },
    ],
  },
  {
    name: "First changes", firstDay: 4, lastDay: 10,
    tasks: [
      { what: "One setting, one block, one small step, after a pattern of three days (two for lows)", who: "person", source: "children’s hospital dose-adjustment guides" },
      { what: "A visit or call within the first week", who: "educator", source: "pump start-up guidance, rev. 2025" },
    ],
  },
  { name: "Settle", firstDay: 11, lastDay: 28, tasks: [{ what: "Longer waits; compare; a call at two weeks", who: "circle", source: "composite of published follow-ups" }] },
  { name: "Steady", firstDay: 29, lastDay: 90, tasks: [{ what: "Four-week and three-month review; kit check", who: "circle", source: "endocrine pump checklist" }] },
];

/** Days after day 1 on which a follow-up is planned, and what it is. A composite of published schedules. */
export const FOLLOW_UPS = [
  { dayOfJournal: 2, what: "Call" },
  { dayOfJournal: 7, what: "Visit" },
  { dayOfJournal: 15, what: "Call" },
  { dayOfJournal: 29, what: "Review" },
  { dayOfJournal: 91, what: "Review" },
] as const;

const COMMONLY: ReadonlyArray<readonly [number, string]> = [
  [1, "Much to look at and little to learn; one meal proves nothing either way."],
  [2, "The urge to change something is strongest now. Many people write it down instead."],
  [3, "A set change; a new site can behave differently."],
  [4, "A first look at lows by part of the day."],
  [6, "Tiredness and doubts are common; many people talk to someone."],
  [8, "Setups that adapt by themselves have seen a week; earlier days are not like later ones."],
  [15, "Many people look fewer times a day."],
  [22, "Fewer looks a day, and an urge to “just see” something new. Written down as a proposal, it keeps."],
  [29, "A time to compare now with the first week, all changes together."],
  [43, "Settings drift back into ordinary life: exercise, weekends, illness."],
  [84, "What would you tell someone on day 1?"],
];

/** What many people find around this day. Common practice, no source; never a promise. */
export function commonlyFound(dayOfJournal: number): string | null {
  return COMMONLY.filter(([day]) => day <= dayOfJournal).at(-1)?.[1] ?? null;
}
