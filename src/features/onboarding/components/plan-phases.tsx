import Link from "next/link";
import { Section } from "@/components/page";
import { isoDayText } from "@/domain/day-text";
import { COMMONLY_FOUND, dateOfDay, PLAN } from "@/domain/journal/plan";

const WHO = { person: "the person", educator: "the educator", circle: "the circle" } as const;

/** The phases with their tasks: who, and on whose authority. */
export function PlanPhases({ dayOne, today, journalId, isOwner }: Readonly<{ dayOne: string | null; today: string; journalId: string; isOwner: boolean }>) {
  const day = (number: number) => (dayOne ? isoDayText(dateOfDay(dayOne, number)) : `day ${number < 1 ? number - 1 : number}`);
  const isNow = (first: number, last: number) => dayOne !== null && dateOfDay(dayOne, first) <= today && today <= dateOfDay(dayOne, last);
  return PLAN.map((phase) => (
    <Section key={phase.name} title={phase.name}>
      <p className="text-note text-soft">
        {phase.firstDay === phase.lastDay ? day(phase.firstDay) : `${day(phase.firstDay)} to ${day(phase.lastDay)}`}
        {isNow(phase.firstDay, phase.lastDay) ? <strong className="ml-2 text-ink">now</strong> : null}
      </p>
      <ul className="max-w-text">
        {phase.tasks.map((task) => (
          <li key={task.what} className="border-b border-hairline py-2">
            {task.at && isOwner ? <Link className="link" href={`/j/${journalId}/${task.at}`}>{task.what}</Link> : task.what}
            <span className="block text-note text-soft">{WHO[task.who]} · {task.source}</span>
          </li>
        ))}
      </ul>
    </Section>
  ));
}

/** What many people find, day by day: reading only, never a promise. */
export function CommonlyFound({ dayOne }: Readonly<{ dayOne: string | null }>) {
  return (
    <Section title="What many people find">
      <p className="text-note text-soft">Common practice, no source, unless a line says otherwise. Never a promise.</p>
      <dl className="max-w-text">
        {COMMONLY_FOUND.map(({ fromDay, label, text }) => (
          <div key={fromDay} className="border-b border-hairline py-2 desk:grid desk:grid-cols-[9rem_1fr]">
            <dt className="font-semibold">{label}{dayOne ? <span className="block text-note font-normal text-soft">from {isoDayText(dateOfDay(dayOne, fromDay))}</span> : null}</dt>
            <dd>{text}</dd>
          </div>
        ))}
      </dl>
    </Section>
  );
}
