import Link from "next/link";
import { Section } from "@/components/page";
import type { planOf } from "../queries/plan";
import { PlanDayForm, StartDayForm } from "./start-day-forms";

type Plan = Awaited<ReturnType<typeof planOf>>;

/** The way to day 1: what is missing, with where it is done, and the two forms. */
export function StartDay({ plan, journalId }: Readonly<{ plan: Plan; journalId: string }>) {
  if (!plan.readiness) return null;
  const { blocks, warns } = plan.readiness;
  const item = ({ code, text, at }: (typeof blocks)[number]) => (
    <li key={`${code} ${text}`} className="border-b border-hairline py-2">
      {at ? <Link className="link" href={`/j/${journalId}/${at}`}>{text}</Link> : text}
    </li>
  );
  return (
    <>
      <Section title={blocks.length > 0 ? "What is still missing for the start day" : "Nothing is missing but two things to tick"}>
        {blocks.length > 0 ? <ul className="max-w-text">{blocks.map(item)}</ul> : <StartDayForm journalId={journalId} today={plan.today} />}
        {warns.length > 0 ? (
          <>
            <h3 className="mt-5 font-sans font-semibold">Worth knowing; it keeps nothing closed</h3>
            <ul className="max-w-text">{warns.map(item)}</ul>
          </>
        ) : null}
      </Section>
      <Section title="The planned day">
        <PlanDayForm journalId={journalId} plannedStartOn={plan.plannedStartOn} />
      </Section>
    </>
  );
}
