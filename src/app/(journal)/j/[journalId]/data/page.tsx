import type { Metadata } from "next";
import Link from "next/link";
import { Caution } from "@/components/caution";
import { Empty } from "@/components/notice";
import { MarginNote, Page, Section } from "@/components/page";
import { counted, dateTimeText } from "@/domain/day-text";
import { journalHeader } from "@/features/days/queries/journal-header";
import { UploadForm } from "@/features/glucose/components/upload-form";
import { importsOf } from "@/features/glucose/queries/imports";
import { forPage } from "@/lib/action";

export const metadata: Metadata = { title: "Data" };

const STATUS_WORDS = { uploaded: "waits for you to say how it is read", running: "being read", done: "stored", stopped: "stopped, nothing stored", undone: "taken out again" } as const;

type Props = Readonly<{ params: Promise<{ journalId: string }>; searchParams: Promise<{ problem?: string }> }>;

export default async function DataPage({ params, searchParams }: Props) {
  const { journalId } = await params;
  const { problem } = await searchParams;
  const { header, imports } = await forPage(async (ctx) => ({ header: await journalHeader(ctx, { journalId }), imports: await importsOf(ctx, { journalId }) }));
  return (
    <Page
      title="Bring in glucose."
      lead={<p>A file from whatever your sensor writes to. The same file twice adds nothing, and each file can be taken out again whole.</p>}
      margin={<><MarginNote title="What is kept"><p>The readings, their own unit and value, the file’s name and fingerprint. The file itself is dropped once it is read.</p></MarginNote><Caution fallbackHref={`/j/${journalId}/fallback`} /></>}
    >
      <UploadForm journalId={journalId} problem={problem} />
      <Section title="Files so far">
        {imports.length === 0 ? (
          <Empty title="None yet."><p>Fourteen days before the start, brought in now, give later changes something to be compared with.</p></Empty>
        ) : (
          <ul className="max-w-text">
            {imports.map((row) => (
              <li key={row.id} className="border-b border-hairline">
                <Link href={`/j/${journalId}/data/${row.id}`} className="flex min-h-target flex-col justify-center py-2.5">
                  <span className="font-semibold">{row.fileName}</span>
                  <span className="text-note text-soft">
                    {dateTimeText(row.createdAt, header.timeZone)} · {STATUS_WORDS[row.status]}
                    {row.status === "done" ? ` · ${counted(row.acceptedCount, "reading")} new` : ""}
                  </span>
                </Link>
              </li>
            ))}
          </ul>
        )}
      </Section>
    </Page>
  );
}
