import type { Metadata } from "next";
import { ButtonLink, ButtonRow } from "@/components/button";
import { Caution } from "@/components/caution";
import { NotchedItem } from "@/components/notched-item";
import { Empty } from "@/components/notice";
import { MarginNote, Page } from "@/components/page";
import { counted, dateTimeText } from "@/domain/day-text";
import { FollowedNote } from "@/features/comparison/components/followed-note";
import { findingsOf } from "@/features/comparison/queries/findings";
import { journalHeader } from "@/features/days/queries/journal-header";
import { VersionItem } from "@/features/settings/components/version-item";
import { changesOf } from "@/features/settings/queries/versions";
import { can } from "@/domain/access/policy";
import { forPage } from "@/lib/action";

export const metadata: Metadata = { title: "Changes" };

export default async function ChangesPage({ params }: Readonly<{ params: Promise<{ journalId: string }> }>) {
  const { journalId } = await params;
  const { header, changes, findings } = await forPage(async (ctx) => ({
    header: await journalHeader(ctx, { journalId }),
    changes: await changesOf(ctx, { journalId }),
    findings: can(ctx.actor, "comparison.read", journalId) ? await findingsOf(ctx, { journalId }) : new Map<number, never>(),
  }));
  const { versions, current } = changes;
  const isOwner = header.role === "person";
  const waiting = versions.find((v) => v.state === "proposed" || v.state === "approved" || v.state === "returned");
  return (
    <Page
      title={versions.length === 0 ? "No version yet." : `${counted(versions.length, "version")}, newest first.`}
      lead={<p>Each notch is one set of settings that was, or may be, in effect. None can be rewritten.</p>}
      margin={
        <>
          {current ? (
            <MarginNote title={`Version ${current.number} is in effect`}>
              <p>Since {current.effectiveFrom ? dateTimeText(current.effectiveFrom, header.timeZone) : "its start"}. Three full days show more than one.</p>
            </MarginNote>
          ) : null}
          {waiting ? <MarginNote title="Waiting"><p>Version {waiting.number} is {waiting.state}. One proposal at a time.</p></MarginNote> : null}
          <Caution fallbackHref={`/j/${journalId}/fallback`} />
        </>
      }
    >
      {isOwner && current && !waiting ? (
        <ButtonRow>
          <ButtonLink href={`/j/${journalId}/changes/new`} kind="next">Propose a change</ButtonLink>
        </ButtonRow>
      ) : null}
      {versions.length === 0 ? (
        <Empty title="The first version is the starting profile.">
          {isOwner ? <p><a className="link" href={`/j/${journalId}/start/about-you`}>Work it out, a page at a time</a></p> : <p>It is being worked out.</p>}
        </Empty>
      ) : (
        <ol className="mt-7">
          {versions.map((version) => (
            <VersionItem
              key={version.number}
              journalId={journalId}
              version={version}
              since={dateTimeText(version.effectiveFrom ?? version.stateSince, header.timeZone)}
              followed={<FollowedNote journalId={journalId} number={version.number} state={version.state} kind={version.kind} finding={findings.get(version.number) ?? null} />}
            />
          ))}
          <NotchedItem number="0" notch="fallback">
            <p className="text-note text-soft"><span className="font-semibold text-ink">Fallback</span> · before day 1</p>
            <h2 className="font-sans text-base font-semibold"><a className="link" href={`/j/${journalId}/fallback`}>Settings of your previous setup</a></h2>
            <p className="text-note text-soft">One press away on every page.</p>
          </NotchedItem>
        </ol>
      )}
    </Page>
  );
}
