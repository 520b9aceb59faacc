import type { Metadata } from "next";
import Link from "next/link";
import { Empty } from "@/components/notice";
import { MarginNote, Page } from "@/components/page";
import { ROLE_WORDS } from "@/features/circle/constants";
import { accessLines } from "@/features/circle/queries/access-log";
import { forPage } from "@/lib/action";

export const metadata: Metadata = { title: "Who looked" };

export default async function AccessLogPage({ params }: Readonly<{ params: Promise<{ journalId: string }> }>) {
  const { journalId } = await params;
  const lines = await forPage((ctx) => accessLines(ctx, { journalId }));
  return (
    <Page
      eyebrow={<Link className="link" href={`/j/${journalId}/circle`}>Circle</Link>}
      title="Who looked at what, when."
      margin={
        <MarginNote title="What stands here">
          <p>Each page of this notebook that a helper opened, each file they fetched, and each weekly mail that told them of it. Your own looks are not noted. No line can be changed or taken out.</p>
        </MarginNote>
      }
    >
      {lines.length === 0 ? (
        <Empty title="Nobody but you has looked.">
          <p>As soon as a helper opens a page of this notebook, it stands here.</p>
        </Empty>
      ) : (
        <ol className="mt-6 max-w-text">
          {lines.map(({ at, when, times, name, role, what }, i) => (
            <li key={`${at.toISOString()}-${i}`} className="border-t border-hairline py-2.5">
              <span className="font-semibold">{what.charAt(0).toUpperCase() + what.slice(1)}</span>
              <span className="block text-note text-soft">
                {name}, {ROLE_WORDS[role]} · <time dateTime={at.toISOString()}>{when}</time>{times > 1 ? `, ${times} times that day` : ""}
              </span>
            </li>
          ))}
        </ol>
      )}
    </Page>
  );
}
