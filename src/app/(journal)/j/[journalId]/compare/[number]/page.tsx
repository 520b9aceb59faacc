import type { Metadata } from "next";
import Link from "next/link";
import { ButtonLink, ButtonRow } from "@/components/button";
import { Bands } from "@/components/charts/bands";
import { BandsTable } from "@/components/charts/bands-table";
import { DayStrip } from "@/components/charts/day-strip";
import { Lens } from "@/components/charts/lens";
import { Page, Section } from "@/components/page";
import { lensFigures } from "@/domain/comparison/difference-label";
import { OUTCOMES } from "@/domain/comparison/outcomes";
import { counted, isoDayText } from "@/domain/day-text";
import { glucoseNumber } from "@/domain/glucose-text";
import { isoDayOfNumber } from "@/domain/iso-day";
import { mgDlToMmol } from "@/domain/units";
import { CommentThread } from "@/features/circle/components/comment-thread";
import { ComparisonMargin } from "@/features/comparison/components/comparison-margin";
import { ExpectationSection } from "@/features/comparison/components/expectation-section";
import { GOVERNED_MINUTES, STRIP_TITLES, STRIP_UNITS } from "@/features/comparison/constants";
import { comparisonOf } from "@/features/comparison/queries/comparison";
import { forPage } from "@/lib/action";

type Params = Readonly<{ params: Promise<{ journalId: string; number: string }> }>;

export async function generateMetadata({ params }: Params): Promise<Metadata> {
  return { title: `What followed version ${(await params).number}` };
}

export default async function ComparisonPage({ params }: Params) {
  const { journalId, number } = await params;
  const view = await forPage((ctx) => comparisonOf(ctx, { journalId, number }));
  const { comparison, finding, journal, bands } = view;
  const unit = journal.glucoseUnit;
  const lens = lensFigures(comparison, unit);
  const isGlucose = OUTCOMES[view.shownOutcome].unit === "mg/dL";
  const inUnit = (mgDl: number) => (unit === "mg/dL" ? Math.round(mgDl) : Math.round(mgDlToMmol(mgDl) * 10) / 10);
  const shownBands = (side: typeof bands.before) => side.map((b) => ({ ...b, p25: inUnit(b.p25), p50: inUnit(b.p50), p75: inUnit(b.p75) }));
  const isLows = comparison.verdict === "more-lows";
  const daysWord = OUTCOMES[view.shownOutcome].days === "nights" ? "night" : "day";
  return (
    <Page
      eyebrow={`Version ${comparison.version} against version ${comparison.against} · ${comparison.attribution === "bundle" ? "several settings changed" : "one setting changed"} · looked at after ${counted(view.cleanAfter, `clean ${daysWord}`)}`}
      title={isLows ? `▼ ${finding.title}` : finding.title}
      lead={
        <>
          {finding.sentences.map((sentence) => <p key={sentence} className="mt-1">{sentence}</p>)}
          {finding.leaning ? <p className="mt-1 font-semibold">{finding.leaning}</p> : null}
          {finding.notes.map((note) => <p key={note} className="mt-2 text-soft">{note}</p>)}
        </>
      }
      margin={<ComparisonMargin view={view} journalId={journalId} />}
    >
      {lens ? <Lens {...lens} /> : null}
      {bands.before.length > 0 && bands.after.length > 0 ? (
        <Section title="By time of day">
          <Bands
            before={shownBands(bands.before)}
            after={shownBands(bands.after)}
            governed={GOVERNED_MINUTES[view.shownOutcome]}
            thresholds={unit === "mg/dL" ? { low: 70, high: 180 } : { low: 3.9, high: 10 }}
            unit={unit}
            label={`Glucose by time of day, before and after version ${comparison.version}; the middle half of readings as a band, the middle as a line. The table below has the same figures.`}
          />
          <BandsTable before={bands.before} after={bands.after} format={(v) => glucoseNumber(v, unit)} />
        </Section>
      ) : null}
      {view.series.length > 0 ? (
        <Section title={STRIP_TITLES[view.shownOutcome]}>
          <DayStrip
            days={view.series}
            changeDay={comparison.days.changeDay}
            label={`${STRIP_TITLES[view.shownOutcome]}: one mark for each ${daysWord}, hollow before and filled after version ${comparison.version}`}
            unitLabel={isGlucose ? unit : STRIP_UNITS[view.shownOutcome]}
            format={(v) => (isGlucose ? glucoseNumber(v, unit) : `${Math.round(v)}%`)}
          />
        </Section>
      ) : null}
      <ExpectationSection view={view} />
      <Section title="What this cannot tell">
        {view.flags.length > 0 ? (
          <p className="max-w-text">
            Also in these days: {view.flags.map((f) => `${f.label.toLowerCase()} (${isoDayText(isoDayOfNumber(f.firstDay))}${f.lastDay > f.firstDay ? ` to ${isoDayText(isoDayOfNumber(f.lastDay))}` : ""})`).join(", ")}.
          </p>
        ) : null}
        <p className="max-w-text">
          Whatever else changed in these days changed with it: meals, sleep, movement, the site, the season. A before and after can’t part them.
        </p>
      </Section>
      <ButtonRow>
        <ButtonLink kind="next" href="#comments">Ask about this</ButtonLink>
        <ButtonLink href={`/j/${journalId}/compare/${comparison.version}/how`}>How this is worked out</ButtonLink>
      </ButtonRow>
      <nav aria-label="Other versions" className="mt-6 text-note text-soft">
        Other versions:{" "}
        {view.comparable.filter((n) => n !== comparison.version).map((n) => (
          <Link key={n} className="link mr-3 inline-block min-h-6 min-w-6 text-center" href={`/j/${journalId}/compare/${n}`}>{n}</Link>
        ))}
      </nav>
      <CommentThread journalId={journalId} subject="comparison" subjectKey={String(comparison.version)} />
    </Page>
  );
}
