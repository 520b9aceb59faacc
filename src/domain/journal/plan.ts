import { addDays } from "@/domain/day-start";

/** Where in a journal a task is done; a path under the journal's own. */
type Place = "data" | "start/about-you" | "start/review" | "fallback" | "circle" | "changes";

export type Task = Readonly<{ what: string; who: "person" | "educator" | "circle"; source: string; at?: Place }>;
export type Phase = Readonly<{ name: string; firstDay: number; lastDay: number; tasks: ReadonlyArray<Task> }>;

const CP = "common practice, no source";
const START_UP = "pump start-up guidance, revised 2025";
const CHILDREN = "children’s hospital dose-adjustment guides";
const COMPOSITE = "composite of published follow-up schedules";

/**
 * The plan (content.md 1); day 1 is the first day on the new setup, day 0 the
 * day before. Lists are data: a clinic may change every one. Sources as in
 * settings.md 1.2, 3.3, 3.5, 4.3 to 4.5 and 6.1.
 */
export const PLAN: ReadonlyArray<Phase> = [
  {
    name: "Prepare", firstDay: -20, lastDay: 0,
    tasks: [
      { what: "Write down every setting of the present setup, or all doses of 7 to 14 days", who: "person", source: "pump workbook, workspace 9.1", at: "start/about-you" },
      { what: "Bring in 14 days of glucose", who: "person", source: "international consensus on time in range, 2019", at: "data" },
      { what: "Answer the questions that come before any number", who: "person", source: CP, at: "start/about-you" },
      { what: "Go through the starting profile and ask for a review", who: "person", source: CP, at: "start/review" },
      { what: "Review of the starting profile", who: "educator", source: "prescriber start-order content, rev. 2025" },
      { what: "Back-up doses written down", who: "educator", source: "UK, Canadian, Finnish and Australian back-up pages", at: "fallback" },
      { what: "Sick-day plan in hand", who: "educator", source: "children’s hospital and university hospital leaflets" },
      { what: "Training on the device done, a set change watched", who: "educator", source: START_UP },
      { what: "Kit packed", who: "person", source: "UK pump e-learning and hospital kit lists" },
      { what: "Two people who can be called; one knows what a severe low looks like", who: "person", source: CP, at: "fallback" },
      { what: "A start day with ordinary meals and no travel, and not before a night alone", who: "person", source: `${START_UP}; the night: ${CP}` },
    ],
  },
  {
    name: "Start day", firstDay: 1, lastDay: 1,
    tasks: [
      { what: "What must be there is there; the start in the morning where possible", who: "person", source: CP },
      { what: "Fallback card on the phone and on paper", who: "person", source: CP, at: "fallback" },
      { what: "Settings entered on the device, then read back by somebody else", who: "circle", source: CP, at: "changes" },
      { what: "A look at glucose before bed and once in the night, about 03:00", who: "person", source: START_UP },
      { what: "A note in the evening", who: "person", source: CP },
    ],
  },
  {
    name: "Watch", firstDay: 1, lastDay: 3,
    tasks: [
      { what: "Nothing is changed unless lows or ketones ask for it", who: "person", source: CHILDREN },
      { what: "Meals and doses are logged as they really are, with no invented carbohydrate", who: "person", source: CP },
      { what: "A call within one to two days", who: "educator", source: COMPOSITE },
      { what: "First set change, watched or described (day 3)", who: "person", source: "pump programme article, day 3" },
    ],
  },
  {
    name: "First changes", firstDay: 4, lastDay: 10,
    tasks: [
      { what: "One setting, one block, one small step, after a pattern of three days (two for lows)", who: "person", source: CHILDREN, at: "changes" },
      { what: "A visit or call within the first week", who: "educator", source: START_UP },
    ],
  },
  {
    name: "Settle", firstDay: 11, lastDay: 28,
    tasks: [
      { what: "Longer waits between changes, and a comparison after each", who: "person", source: CP, at: "changes" },
      { what: "Questions from the mentor", who: "circle", source: CP, at: "circle" },
      { what: "A call at two weeks", who: "educator", source: COMPOSITE },
    ],
  },
  {
    name: "Steady", firstDay: 29, lastDay: 90,
    tasks: [
      { what: "Review at four weeks and at three months, with the clinic sheet", who: "educator", source: "endocrine pump checklist" },
      { what: "Which notes are worth keeping up", who: "person", source: CP },
      { what: "Kit looked through: dates, supplies, numbers", who: "person", source: CP },
    ],
  },
];

/** What is special about where a person comes from (content.md 1, variants). */
export const PLAN_VARIANTS = {
  injections: "From injections: the long-acting doses of the last days are written down with their times. A first-ever pump is led by the educator.",
  pump: "From a pump: settings that work are carried over unchanged, with the arithmetic beside them.",
  "closed-loop": "From another closed loop: say which settings that setup really used. The same number may not mean the same here.",
} as const;

/** Days after day 1 on which a follow-up is planned, and what it is. A composite of published schedules. */
export const FOLLOW_UPS = [
  { dayOfJournal: 2, what: "Call" },
  { dayOfJournal: 7, what: "Visit" },
  { dayOfJournal: 15, what: "Call" },
  { dayOfJournal: 29, what: "Review" },
  { dayOfJournal: 91, what: "Review" },
] as const;

/** What is looked through each time, after an endocrine pump checklist (settings.md 3.5). */
export const REVIEWED_EACH_TIME = [
  "patterns", "lows and how they were treated", "total daily dose", "basal share", "number of blocks", "exits from automation", "sick days", "back-up doses still right", "sites",
] as const;

/** The civil date of a day of the journal; day 1 is `dayOne`. */
export function dateOfDay(dayOne: string, dayOfJournal: number): string {
  return addDays(dayOne, dayOfJournal - 1);
}

/** What many people find from a day on; common practice without a source, except where a note says so. */
export const COMMONLY_FOUND: ReadonlyArray<Readonly<{ fromDay: number; label: string; text: string }>> = [
  { fromDay: 1, label: "Day 1", text: "Much to look at and little to learn; one meal proves nothing either way." },
  { fromDay: 2, label: "Day 2", text: "The urge to change something is strongest now. Many people write it down instead." },
  { fromDay: 3, label: "Day 3", text: "A set change; a new site can behave differently (abstract on site age, 2026)." },
  { fromDay: 4, label: "Days 4 and 5", text: "A first look at lows by part of the day." },
  { fromDay: 6, label: "Days 6 and 7", text: "Tiredness and doubts are common; many people talk to someone." },
  { fromDay: 8, label: "Week 2", text: "A setup that adapts by itself has only now seen two weeks. Earlier days are not like later ones, and the error bar is wider for it." },
  { fromDay: 15, label: "Week 3", text: "Many people look fewer times a day." },
  { fromDay: 22, label: "Week 4", text: "A time to compare now with the first week, all changes together." },
  { fromDay: 36, label: "Weeks 6 to 8", text: "Settings drift back into ordinary life: exercise, weekends, illness." },
  { fromDay: 78, label: "Week 12", text: "What would you tell someone on day 1?" },
];

/** What many people find around this day; never a promise. */
export function commonlyFound(dayOfJournal: number): string | null {
  return COMMONLY_FOUND.filter(({ fromDay }) => fromDay <= dayOfJournal).at(-1)?.text ?? null;
}
