import type { VersionState } from "@/domain/journal/version-lifecycle";
import type { ChangeReason } from "@/domain/settings/change-reason";
import type { Expectation } from "@/domain/settings/expectation";
import type { SettingsProfile } from "@/domain/settings/profile";
import { DEMO_EFFECTIVE, type DemoMoment } from "./demo-calendar";
import type { DemoRole } from "./demo-people";
import { DEMO_PROFILES } from "./demo-profiles";

/** An educator's decision on a version of the demo. */
export type DemoReview = Readonly<{
  decision: "approved" | "returned"; by: DemoRole; at: DemoMoment; reason: string; remarks: string; reviewOnDay: number | null;
}>;

/** One version, or one revision of it, as it stands at the end of the story. Days are days of the story. */
export type DemoVersion = Readonly<{
  number: number; revision: number; parentNumber: number | null; kind: "starting" | "change" | "undo";
  profile: SettingsProfile;
  reason: Readonly<{ code: ChangeReason; text: string }>;
  expectation: Expectation | null;
  evidenceDays: ReadonlyArray<number>; lookAgainDay: number | null; revertRule: string;
  author: DemoRole; createdAt: DemoMoment;
  review: DemoReview | null;
  effectiveFrom: DemoMoment | null;
  state: VersionState;
}>;

const NO_RULE = "";
const RISE_AFTER_BREAKFAST: Expectation = { outcome: "rise-after-meals", window: "after-breakfast", direction: "fall" };
const NIGHT_FALLS: Expectation = { outcome: "mean-glucose", window: "night", direction: "fall" };

/** The versions of the demo in the order they were written (content.md 13). */
export const DEMO_VERSIONS: ReadonlyArray<DemoVersion> = [
  {
    number: 1, revision: 1, parentNumber: null, kind: "starting", profile: DEMO_PROFILES.start,
    reason: { code: "educator-said", text: "A cautious start, worked out together from my injections and my weight." },
    expectation: null, evidenceDays: [], lookAgainDay: 4, revertRule: "I go back to injections if my educator says so.",
    author: "person", createdAt: { day: -3, minute: 1125 },
    review: { decision: "approved", by: "educator", at: { day: -1, minute: 620 }, reason: "", remarks: "Arithmetic looked at together. Back-up doses and sick-day plan are in hand. We talk on day 2.", reviewOnDay: 7 },
    effectiveFrom: DEMO_EFFECTIVE.version1, state: "superseded",
  },
  {
    number: 2, revision: 1, parentNumber: 1, kind: "change", profile: DEMO_PROFILES.breakfast15,
    reason: { code: "pattern-high", text: "After breakfast I stay high until noon, on every working day so far." },
    expectation: RISE_AFTER_BREAKFAST, evidenceDays: [3, 4, 5], lookAgainDay: 10, revertRule: "I go back if there is a low before lunch on 2 days.",
    author: "person", createdAt: { day: 6, minute: 372 }, review: null, effectiveFrom: DEMO_EFFECTIVE.version2, state: "superseded",
  },
  {
    number: 3, revision: 1, parentNumber: 2, kind: "change", profile: DEMO_PROFILES.nightAndBreakfast,
    reason: { code: "pattern-high", text: "Nights drift up, and breakfast is still steep. I would like to change both." },
    expectation: { outcome: "time-in-range", window: "whole-day", direction: "rise" }, evidenceDays: [4, 5, 7], lookAgainDay: 12, revertRule: NO_RULE,
    author: "person", createdAt: { day: 8, minute: 1195 },
    review: { decision: "returned", by: "educator", at: { day: 8, minute: 1300 }, reason: "too-many-at-once", remarks: "Two settings at once. Then neither of us could say which one did it. Which matters most to you, the night or the breakfast?", reviewOnDay: null },
    effectiveFrom: null, state: "returned",
  },
  {
    number: 3, revision: 2, parentNumber: 2, kind: "change", profile: DEMO_PROFILES.night055,
    reason: { code: "pattern-high", text: "The night matters most: I wake up high after quiet evenings, without food or boluses in between." },
    expectation: NIGHT_FALLS, evidenceDays: [4, 5, 7], lookAgainDay: 16, revertRule: "I go back if there is any low below 54 mg/dL at night.",
    author: "person", createdAt: { day: 9, minute: 1170 },
    review: { decision: "approved", by: "educator", at: { day: 10, minute: 545 }, reason: "", remarks: "One setting, one block, a small step. Look at 03:00 once in the first two nights.", reviewOnDay: 14 },
    effectiveFrom: DEMO_EFFECTIVE.version3, state: "superseded",
  },
  {
    number: 4, revision: 1, parentNumber: 3, kind: "change", profile: DEMO_PROFILES.afternoon50,
    reason: { code: "pattern-high", text: "Corrections at noon come down slowly. Perhaps they are too small." },
    expectation: { outcome: "fall-after-correction", window: "after-corrections", direction: "rise" }, evidenceDays: [13, 17, 18], lookAgainDay: 23, revertRule: "I go back if there are lows on 3 afternoons.",
    author: "person", createdAt: { day: 19, minute: 700 }, review: null, effectiveFrom: DEMO_EFFECTIVE.version4, state: "superseded",
  },
  {
    number: 5, revision: 1, parentNumber: 4, kind: "undo", profile: DEMO_PROFILES.night055,
    reason: { code: "undo", text: "Lows on three afternoons running. That was my rule, so back to version 3." },
    expectation: { outcome: "lows", window: "whole-day", direction: "fall" }, evidenceDays: [20, 21, 22], lookAgainDay: 30, revertRule: NO_RULE,
    author: "person", createdAt: { day: 23, minute: 1155 }, review: null, effectiveFrom: DEMO_EFFECTIVE.version5, state: "in-effect",
  },
  {
    number: 6, revision: 1, parentNumber: 5, kind: "change", profile: DEMO_PROFILES.breakfast14,
    reason: { code: "talked-with-mentor", text: "Breakfast is the steepest hour of my day, and four weeks of it say so." },
    expectation: RISE_AFTER_BREAKFAST, evidenceDays: [26, 28, 29, 30], lookAgainDay: 42, revertRule: "I go back if there is a low before lunch on 2 days.",
    author: "person", createdAt: { day: 31, minute: 1230 }, review: null, effectiveFrom: null, state: "proposed",
  },
];
