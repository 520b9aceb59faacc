import Link from "next/link";
import { Notice } from "@/components/notice";
import { Section } from "@/components/page";
import { localOfInstant } from "@/domain/local-time";
import { STEP_NAMES } from "@/domain/onboarding/wizard-step";
import { checkProfile } from "@/domain/settings/checks";
import { profileFromApi } from "@/domain/settings/profile-api";
import { basalDayText, sideBySide } from "@/domain/onboarding/side-by-side";
import type { WizardView } from "../queries/wizard";
import { ProposeForm, RecordForm } from "./propose-form";
import { missingPages, ReviewList } from "./review-list";
import { SideBySideTable } from "./side-by-side-table";

/** All of the start on one page: what is now, the arithmetic, the start, the checks, and the one next step. */
export function ReviewPage({ view, journalId }: Readonly<{ view: WizardView; journalId: string }>) {
  const missing = missingPages(view);
  const checks = view.profile && view.isGateOpen === true ? checkProfile(view.profile, view.checkFacts) : [];
  return (
    <>
      <StartTable view={view} />
      {checks.length > 0 ? (
        <Section title="Checks">
          <ul className="max-w-text">{checks.map((c) => <li key={c.text} className="border-t border-hairline py-2">{c.severity === "blocks" ? <strong>Mend before asking: </strong> : null}{c.severity === "asks" ? <strong>To look at: </strong> : null}{c.text}</li>)}</ul>
        </Section>
      ) : null}
      <ReviewList view={view} journalId={journalId} />
      <Section title="What your educator will see">
        <p className="max-w-text">This profile with its fingerprint, the arithmetic with every rule and source, your answers to the twelve questions, your present doses, the checks, the glucose and notes that you share, and your note below.</p>
        {view.hasEducator ? null : <p className="mt-2 max-w-text border-l-4 border-edge pl-4">No educator is in your circle yet. You can ask all the same; it waits until somebody accepts. <Link className="link" href={`/j/${journalId}/circle`}>Invite an educator</Link></p>}
      </Section>
      {missing.length === 0 ? (
        <>
          <ProposeForm journalId={journalId} rowVersion={view.rowVersion} />
          {view.mayRecord ? (
            <details className="mt-10 max-w-text border-t border-hairline pt-3">
              <summary className="min-h-target text-soft">Record without a review</summary>
              <RecordForm journalId={journalId} rowVersion={view.rowVersion} now={localOfInstant(view.now, view.journal.timeZone)} />
            </details>
          ) : null}
        </>
      ) : (
        <p className="mt-6 max-w-text font-semibold">
          Before asking:{" "}
          {missing.map((step) => <Link key={step} className="link mr-3 inline-flex min-h-8 items-center" href={`/j/${journalId}/start/${step}?return=review`}>{STEP_NAMES[step]}</Link>)}
        </p>
      )}
    </>
  );
}

/** The three columns; nothing of the arithmetic while the gate is closed. */
function StartTable({ view }: Readonly<{ view: WizardView }>) {
  const { profile, arithmetic, working, journal } = view;
  if (!profile || view.isGateOpen !== true) return null;
  const now = working ? profileFromApi(working) : null;
  return (
    <Section title={`${basalDayText(profile.basal)} of basal a day to begin with`}>
      {now ? <p className="max-w-text">{basalDayText(now.basal)} a day now. Settings that work are carried over; the arithmetic stands beside them.</p> : null}
      <SideBySideTable rows={sideBySide(profile, now, arithmetic, journal.glucoseUnit)} hasNow={now !== null} />
    </Section>
  );
}

/** Once it was sent nothing here can be changed; a return with remarks opens it again. */
export function SentPage({ view, journalId, sentAs }: Readonly<{ view: WizardView; journalId: string; sentAs: NonNullable<WizardView["sentAs"]> }>) {
  return (
    <>
      <Notice>
        <p>This became version {sentAs.number} and can’t be changed here. <Link className="link" href={`/j/${journalId}/changes/${sentAs.number}`}>See how it stands</Link></p>
        {sentAs.state === "proposed" && !view.hasEducator ? <p>No educator is in your circle yet. <Link className="link" href={`/j/${journalId}/circle`}>Invite an educator</Link></p> : null}
      </Notice>
      <StartTable view={view} />
      <ReviewList view={view} journalId={journalId} isReadOnly />
    </>
  );
}
