import type { Metadata } from "next";
import { ButtonLink, ButtonRow } from "@/components/button";
import { Caution } from "@/components/caution";
import { Notice } from "@/components/notice";
import { MarginNote, Page, Section } from "@/components/page";
import { dateTimeText } from "@/domain/day-text";
import { localOfInstant } from "@/domain/local-time";
import { CommentThread } from "@/features/circle/components/comment-thread";
import { journalHeader } from "@/features/days/queries/journal-header";
import { ProfileTable } from "@/features/settings/components/profile-table";
import { EffectForm, ReturnForm, WithdrawForm } from "@/features/settings/components/version-acts";
import { STATE_WORDS } from "@/features/settings/constants";
import { versionDetail } from "@/features/settings/queries/versions";
import { forPage } from "@/lib/action";

type Params = Readonly<{ params: Promise<{ journalId: string; number: string }> }>;

export async function generateMetadata({ params }: Params): Promise<Metadata> {
  return { title: `Version ${(await params).number}` };
}

export default async function VersionPage({ params }: Params) {
  const { journalId, number } = await params;
  const { header, detail, now } = await forPage(async (ctx) => ({
    header: await journalHeader(ctx, { journalId }),
    detail: await versionDetail(ctx, { journalId, number }),
    now: ctx.now(),
  }));
  const { version, summary } = detail;
  const isOwner = header.role === "person";
  const at = (instant: Date) => dateTimeText(instant, header.timeZone);
  return (
    <Page
      eyebrow={`Version ${version.number}${version.revision > 1 ? `, wording ${version.revision}` : ""} · ${STATE_WORDS[version.state]} since ${at(version.stateSince)}`}
      title={version.kind === "starting" ? "The starting profile." : summary.lines[0] ?? `Version ${version.number}.`}
      lead={<>{summary.lines.slice(1).map((line) => <p key={line}>{line}</p>)}{summary.reason ? <p>{summary.reason}</p> : null}</>}
      margin={
        <>
          <MarginNote title="Written by"><p>{version.authorName}, {at(version.createdAt)}</p></MarginNote>
          {summary.expectation ? <MarginNote title="What was hoped for"><p>{summary.expectation}. Fixed before the data.</p></MarginNote> : null}
          {version.revertRule ? <MarginNote title="The way back"><p>{version.revertRule}.</p></MarginNote> : null}
          {version.guardrails.map((g) => <MarginNote key={g.code} title="A guardrail spoke"><p>{g.text}{g.answer ? ` Answer: “${g.answer}”` : ""}</p></MarginNote>)}
          <MarginNote title="Fingerprint of the content"><p className="break-all">{version.contentHash}</p></MarginNote>
          <Caution fallbackHref={`/j/${journalId}/fallback`} />
        </>
      }
    >
      {version.state === "proposed" && isOwner ? <Notice><p>Sent to your educator. You will get a mail when there is a decision.</p></Notice> : null}
      {version.state === "returned" && isOwner ? <Notice><p>Your educator sent this back with remarks below.</p></Notice> : null}
      {summary.reviews.length > 0 ? (
        <Section title="Decisions">
          <ul>
            {summary.reviews.map((review) => (
              <li key={`${review.revision}-${review.decision}`} className="border-t border-hairline py-3">
                <p className="font-semibold">{review.reviewerName} {review.decision} this on {at(review.at)}</p>
                {review.signOffText ? <p className="max-w-text">“{review.signOffText}”</p> : null}
                {review.remarks ? <p className="max-w-text">{review.remarks}</p> : null}
              </li>
            ))}
          </ul>
        </Section>
      ) : null}
      <Section title="Every setting of this version">
        {isOwner && header.isGateOpen === false && version.approvedHash === null ? <p className="max-w-text">Your educator sees these numbers first. They show here once they are approved.</p> : <ProfileTable profile={version.profile} unit={header.unit} />}
      </Section>
      {isOwner && version.state === "approved" ? (
        <Section title="Put it into effect"><EffectForm journalId={journalId} number={version.number} contentHash={version.contentHash} now={localOfInstant(now, header.timeZone)} /></Section>
      ) : null}
      {isOwner && version.kind === "starting" && version.state === "returned" ? (
        <ButtonRow><ButtonLink kind="next" href={`/j/${journalId}/start/review`}>Mend the starting profile</ButtonLink></ButtonRow>
      ) : null}
      {version.effectiveFrom && version.parentNumber !== null ? (
        <ButtonRow><ButtonLink kind="next" href={`/j/${journalId}/compare/${version.number}`}>See what followed</ButtonLink></ButtonRow>
      ) : null}
      {isOwner && version.state === "superseded" ? (
        <Section title="Go back to this version"><ReturnForm journalId={journalId} number={version.number} mayRecord={header.isGateOpen === true} /></Section>
      ) : null}
      {isOwner && ["proposed", "approved", "returned"].includes(version.state) ? (
        <Section title="Take it back"><WithdrawForm journalId={journalId} number={version.number} /></Section>
      ) : null}
      <CommentThread journalId={journalId} subject="version" subjectKey={String(version.number)} />
    </Page>
  );
}
