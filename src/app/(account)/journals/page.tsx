import type { Metadata } from "next";
import Link from "next/link";
import { ButtonLink, ButtonRow } from "@/components/button";
import { Caution } from "@/components/caution";
import { Empty } from "@/components/notice";
import { Page } from "@/components/page";
import { myJournals } from "@/features/onboarding/queries/my-journals";
import { STATE_WORDS } from "@/features/settings/constants";
import { forPage } from "@/lib/action";

export const metadata: Metadata = { title: "Journals" };

const ROLE_WORDS = { person: "yours", mentor: "you are the mentor", educator: "you are the educator", family: "you help as family" } as const;

export default async function JournalsPage() {
  const journals = await forPage(myJournals);
  return (
    <Page title="Your notebooks." margin={<Caution />}>
      {journals.length === 0 ? (
        <Empty title="No notebook yet.">
          <p>Start one of your own, or open the invitation that somebody sent you by e-mail.</p>
        </Empty>
      ) : (
        <ul className="mt-6 max-w-text">
          {journals.map((journal) => (
            <li key={journal.journalId} className="border-b border-hairline">
              <Link href={`/j/${journal.journalId}/${journal.newest ? "today" : journal.isOwn ? "start/about-you" : "changes"}`} className="flex min-h-target flex-col justify-center py-3">
                <span className="font-semibold">{journal.name}</span>
                <span className="text-note text-soft">
                  {journal.isOwn ? "" : `${journal.ownerName} · `}
                  {ROLE_WORDS[journal.role]}
                  {journal.newest ? ` · version ${journal.newest.number}: ${STATE_WORDS[journal.newest.state].toLowerCase()}` : " · no version yet"}
                </span>
              </Link>
            </li>
          ))}
        </ul>
      )}
      <ButtonRow><ButtonLink kind="next" href="/journals/new">Start a journal</ButtonLink></ButtonRow>
    </Page>
  );
}
