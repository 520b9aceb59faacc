import type { Metadata } from "next";
import Link from "next/link";
import { Caution } from "@/components/caution";
import { Empty, Notice } from "@/components/notice";
import { Page } from "@/components/page";
import { counted, dateTimeText } from "@/domain/day-text";
import { reviewQueue } from "@/features/review/queries/reviews";
import { forPage } from "@/lib/action";

export const metadata: Metadata = { title: "Reviews" };

export default async function ReviewsPage({ searchParams }: Readonly<{ searchParams: Promise<{ decided?: string }> }>) {
  const { decided } = await searchParams;
  const { waiting, isLicensed } = await forPage(reviewQueue);
  return (
    <Page title={waiting.length === 0 ? "Nobody is waiting." : `${counted(waiting.length, "proposal")} waiting for you.`} lead={<p>Longest wait first.</p>} margin={<Caution />}>
      {decided ? <Notice><p>Your decision is in the person’s journal, and a mail is on its way to them.</p></Notice> : null}
      {isLicensed ? null : <Notice><p>Your licence is not verified yet, or has run out. <Link className="link" href="/account">See your account</Link></p></Notice>}
      {waiting.length === 0 ? (
        <Empty title="The queue is empty."><p>When a person asks for a review you get a mail, and it stands here.</p></Empty>
      ) : (
        <ul className="mt-6 max-w-text">
          {waiting.map((row) => (
            <li key={`${row.journalId}-${row.number}`} className="border-b border-hairline">
              <Link href={`/review/${row.journalId}/${row.number}`} className="flex min-h-target flex-col justify-center py-3">
                <span className="font-semibold">{row.personName}: {row.kind === "starting" ? "a starting profile" : `version ${row.number}`}</span>
                <span className="text-note text-soft">
                  waiting since {dateTimeText(row.since, "UTC")} UTC
                  {row.hasLows ? <strong className="text-low"> · ▼ lows above the usual aim</strong> : null}
                  {row.gateReasons.length > 0 ? ` · ${counted(row.gateReasons.length, "gate reason")}` : ""}
                </span>
              </Link>
            </li>
          ))}
        </ul>
      )}
    </Page>
  );
}
