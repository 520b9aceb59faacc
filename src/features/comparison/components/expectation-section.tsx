import { Section } from "@/components/page";
import { expectationAnswer } from "@/domain/comparison/expectation-answer";
import { EXPECTED_DIRECTIONS, EXPECTED_OUTCOMES, EXPECTED_WINDOWS } from "@/domain/settings/expectation";
import { dateText } from "@/domain/day-text";
import type { ComparisonView } from "../queries/comparison";

const WORDS = { met: "Met so far.", "not-met": "Not met so far.", "not-yet": "Can’t be told yet." } as const;

/** What was hoped for, fixed before the data, and whether it was met. */
export function ExpectationSection({ view }: Readonly<{ view: ComparisonView }>) {
  const { expectation, createdAt } = view.version;
  if (!expectation) return null;
  return (
    <Section title="What was expected">
      <p className="max-w-text">
        On {dateText(createdAt, view.journal.timeZone)}, before the data: “{EXPECTED_OUTCOMES[expectation.outcome]} {EXPECTED_WINDOWS[expectation.window]}{" "}
        {EXPECTED_DIRECTIONS[expectation.direction]}.” <strong className="text-range">{WORDS[expectationAnswer(view.comparison.verdict)]}</strong>
      </p>
    </Section>
  );
}
