import type { Metadata } from "next";
import { ButtonLink, ButtonRow } from "@/components/button";
import { Caution } from "@/components/caution";
import { Notice } from "@/components/notice";
import { MarginNote, Page, Section } from "@/components/page";
import { counted, dateTimeText } from "@/domain/day-text";
import { ImportForm } from "@/features/glucose/components/import-form";
import { ImportProgress } from "@/features/glucose/components/import-progress";
import { UndoForm } from "@/features/glucose/components/undo-form";
import { importDetail } from "@/features/glucose/queries/imports";
import { forPage } from "@/lib/action";
import { zoneNames } from "@/domain/zone-name";

export const metadata: Metadata = { title: "A file" };

export default async function ImportPage({ params }: Readonly<{ params: Promise<{ journalId: string; importId: string }> }>) {
  const { journalId, importId } = await params;
  const { journal, found, preview, refusals } = await forPage((ctx) => importDetail(ctx, { journalId, importId }));
  const isWaiting = found.status === "uploaded" || found.status === "stopped";
  const title = found.status === "done" ? `${counted(found.acceptedCount, "reading")} stored.` : found.status === "undone" ? "Taken out again." : found.status === "running" ? "Being read." : "Is this how it reads?";
  return (
    <Page
      eyebrow={`${found.fileName} · ${Math.ceil(found.byteCount / 1024)} kB`}
      title={title}
      margin={
        <>
          {found.unit ? <MarginNote title="Read as"><p>{found.unit}, clock of {found.timeZone}</p></MarginNote> : null}
          <MarginNote title="Fingerprint of the file"><p className="break-all">{found.fileHash}</p></MarginNote>
          <Caution fallbackHref={`/j/${journalId}/fallback`} />
        </>
      }
    >
      {found.status === "stopped" ? <Notice><p>{found.stopReason} Store it again, or drop it.</p></Notice> : null}
      {found.status === "running" ? <ImportProgress journalId={journalId} importId={importId} onEnd="reload" /> : null}
      {found.status === "done" ? (
        <>
          <table className="table mt-5 max-w-md">
            <tbody>
              <tr><th scope="row">Rows read</th><td className="number">{found.rowCount}</td></tr>
              <tr><th scope="row">New readings</th><td className="number">{found.acceptedCount}</td></tr>
              <tr><th scope="row">There already</th><td className="number">{found.duplicateCount}</td></tr>
              <tr><th scope="row">Refused</th><td className="number">{found.refusedCount}</td></tr>
            </tbody>
          </table>
          {found.firstAt && found.lastAt ? <p className="mt-3">From {dateTimeText(found.firstAt, journal.timeZone)} to {dateTimeText(found.lastAt, journal.timeZone)}.</p> : null}
          <ButtonRow><ButtonLink kind="next" href={`/j/${journalId}/days`}>See the days</ButtonLink></ButtonRow>
        </>
      ) : null}
      {refusals.length > 0 ? (
        <Section title="Rows that were refused">
          <table className="table max-w-text">
            <thead><tr><th scope="col">Line</th><th scope="col">Why</th></tr></thead>
            <tbody>{refusals.map((r) => <tr key={r.line}><th scope="row" className="font-normal">{r.line}</th><td>{r.text}</td></tr>)}</tbody>
          </table>
        </Section>
      ) : null}
      {isWaiting && preview ? (
        <>
          <Section title="The first rows">
            <div className="overflow-x-auto" tabIndex={0} role="region" aria-label="The first rows of the file">
              <table className="table">
                <thead><tr>{preview.columns.map((c, i) => <th key={i} scope="col">{c}</th>)}</tr></thead>
                <tbody>{preview.sampleRows.map((row, i) => <tr key={i}>{row.map((f, k) => <td key={k}>{f}</td>)}</tr>)}</tbody>
              </table>
            </div>
          </Section>
          <ImportForm journalId={journalId} importId={importId} preview={preview} zones={zoneNames()} timeZone={journal.timeZone} />
        </>
      ) : null}
      {found.status === "done" || isWaiting ? (
        <Section title={isWaiting ? "Not this file" : "Take it out again"}>
          <p className="max-w-text">{isWaiting ? "Nothing of it is stored." : "Every reading that came with this file goes; readings of other files stay."}</p>
          <UndoForm journalId={journalId} importId={importId} label={isWaiting ? "Drop the file" : "Take this file out"} />
        </Section>
      ) : null}
    </Page>
  );
}
