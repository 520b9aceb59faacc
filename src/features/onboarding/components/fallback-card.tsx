import { Section } from "@/components/page";
import { dateText } from "@/domain/day-text";
import type { fallbackCard } from "../queries/fallback-card";
import { BackUpRows } from "./back-up-table";

export type FallbackView = Awaited<ReturnType<typeof fallbackCard>>;
type Card = NonNullable<FallbackView["card"]>;

/** The body of the card: two columns on a desk and on paper, so that it fits on one page. */
export function FallbackCard({ fallback, card, timeZone }: Readonly<{ fallback: FallbackView; card: Card; timeZone: string }>) {
  return (
    <div className="desk:grid desk:grid-cols-2 desk:gap-x-10 print:grid print:grid-cols-2 print:gap-x-8">
      <Section title="What to go back to">
        {card.previousSetup === "" ? <p>Not written down yet.</p> : <p className="whitespace-pre-line">{card.previousSetup}</p>}
      </Section>
      <Section title="Who can be called">
        <ul>{card.contacts.map((c) => <li key={`${c.name} ${c.phone}`}>{c.name}: <a className="link inline-flex min-h-8 items-center" href={`tel:${c.phone.replace(/[^+\d]/g, "")}`}>{c.phone}</a></li>)}</ul>
        {card.emergencyNumber === "" ? <p className="mt-1">No emergency number is written down yet.</p> : <p className="mt-1">Emergency: <a className="link inline-flex min-h-8 items-center font-semibold" href={`tel:${card.emergencyNumber.replace(/[^+\d]/g, "")}`}>{card.emergencyNumber}</a></p>}
      </Section>
      <Section title="Ketones">
        <p className="font-semibold">Your clinic’s own levels and your written plan come first. Where there are none at hand, leaflets say:</p>
        <ul className="mt-1">
          <li className="border-t border-hairline py-1">Below 0.6 mmol/L: as on any day.</li>
          <li className="border-t border-hairline py-1">0.6 or more: sick-day plan; look at the infusion site; measure again in 1 to 2 hours.</li>
          <li className="border-t border-hairline py-1">1.5 or more: call your team.</li>
          <li className="border-y border-hairline py-1 font-semibold">3.0 or more, vomiting, or drowsy: emergency.</li>
        </ul>
        <p className="mt-1 text-note text-soft">Source: children’s hospital leaflets (Alder Hey; Royal Children’s Hospital Melbourne). Levels differ between clinics.</p>
      </Section>
      <Section title="Back-up doses">
        <Doses fallback={fallback} card={card} timeZone={timeZone} />
        {fallback.backUp.length > 0 && fallback.basis ? (
          <>
            <p className="mt-2 text-note text-soft">Published arithmetic for version {fallback.basis.number}{fallback.basis.state === "in-effect" ? "" : `, ${fallback.basis.state}`}, worked from its programmed basal:</p>
            <BackUpRows doses={fallback.backUp} />
          </>
        ) : null}
      </Section>
    </div>
  );
}

function Doses({ fallback, card, timeZone }: Readonly<{ fallback: FallbackView; card: Card; timeZone: string }>) {
  const { longActingMilliUnits: long, rapidMilliUnits: rapid } = card;
  if (long === null && rapid === null) return <p>None written down yet. Your educator marks one of the published ways.</p>;
  return (
    <>
      {long === null ? null : <p className="font-semibold">Long-acting insulin: {long / 1000} U a day</p>}
      {rapid === null ? null : <p className="font-semibold">Rapid insulin while no long-acting is at hand: {rapid / 1000} U every 4 hours</p>}
      <p className="text-note text-soft">{fallback.writtenBy ? `Written down by ${fallback.writtenBy.name}, ${dateText(fallback.writtenBy.at, timeZone)}.` : "Written down by the person, as told by their educator."}</p>
    </>
  );
}
