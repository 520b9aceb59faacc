import type { AnswerLine } from "@/domain/onboarding/answer-lines";

/** Answers as the person typed them, a line each. */
export function AnswerList({ lines }: Readonly<{ lines: ReadonlyArray<AnswerLine> }>) {
  return (
    <dl>
      {lines.map(({ label, value }, i) => (
        <div key={`${i} ${label}`} className="flex justify-between gap-6 py-0.5">
          <dt className="text-soft">{label}</dt>
          <dd className="shrink-0 max-w-[60%] text-right whitespace-pre-line">{value}</dd>
        </div>
      ))}
    </dl>
  );
}
