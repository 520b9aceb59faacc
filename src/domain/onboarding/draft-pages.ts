import type { DraftAnswers, TypedPage } from "./draft";
import type { WizardStep } from "./wizard-step";

/** Texts kept beside a page at most; a further one takes the place of the oldest. */
const MOST_ASIDE = 20;

/** The draft's count when a page was last saved; 0 for one that never was. */
export function savedCountOf(answers: DraftAnswers, step: WizardStep): number {
  const count = answers.saved?.[step];
  return typeof count === "number" ? count : 0;
}

/** What was typed elsewhere for a page and waits for a choice, oldest first. */
export function asideOf(answers: DraftAnswers, step: WizardStep): ReadonlyArray<TypedPage> {
  const kept = answers.aside?.[step];
  return Array.isArray(kept) ? (kept as TypedPage[]) : [];
}

/** The draft with a page saved under its new count. */
export function withPage(answers: DraftAnswers, step: WizardStep, typed: TypedPage, count: number): DraftAnswers {
  return { ...answers, [step]: typed, saved: { ...answers.saved, [step]: count } };
}

/** The draft with a text kept beside a page that was saved on another device meanwhile. */
export function withAside(answers: DraftAnswers, step: WizardStep, typed: TypedPage): DraftAnswers {
  const kept = asideOf(answers, step).filter((other) => !isSamePage(other, typed));
  return { ...answers, aside: { ...answers.aside, [step]: [...kept, typed].slice(-MOST_ASIDE) } };
}

/** The draft once a choice was made: nothing waits beside the page any more. */
export function withoutAside(answers: DraftAnswers, step: WizardStep): DraftAnswers {
  const { [step]: _chosen, ...others } = answers.aside ?? {};
  return { ...answers, aside: others };
}

/** Whether two pages hold the same text in every field; one left out is one left empty. */
export function isSamePage(a: unknown, b: unknown): boolean {
  return JSON.stringify(plain(a)) === JSON.stringify(plain(b));
}

/** Fields in one order, empty ones dropped. */
function plain(value: unknown): unknown {
  if (Array.isArray(value)) return value.map(plain).filter((item) => item !== undefined);
  if (value === null || value === undefined || value === "") return undefined;
  if (typeof value !== "object") return typeof value === "string" ? value.trim() : JSON.stringify(value);
  const entries = Object.entries(value)
    .map(([key, inner]) => [key, plain(inner)] as const)
    .filter(([, inner]) => inner !== undefined)
    .toSorted(([x], [y]) => (x < y ? -1 : 1));
  return entries.length === 0 ? undefined : Object.fromEntries(entries);
}
