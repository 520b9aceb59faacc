import type { Metadata } from "next";
import Link from "next/link";
import { ButtonLink, ButtonRow } from "@/components/button";
import { Caution } from "@/components/caution";
import { Empty } from "@/components/notice";
import { Page, Section } from "@/components/page";
import { dateText } from "@/domain/day-text";
import { myJournals } from "@/features/onboarding/queries/my-journals";
import { STATE_WORDS } from "@/features/settings/constants";
import { forPage } from "@/lib/action";

export const metadata: Metadata = { title: "Journals" };

const ROLE_WORDS = { person: "yours", mentor: "you are the mentor", educator: "you are the educator", family: "you help as family" } as const;

type Journal = Awaited<ReturnType<typeof myJournals>>[number];

export default async function JournalsPage() {
  const journals = await forPage(myJournals);
  const own = journals.filter(({ isOwn }) => isOwn);
  const helped = journals.filter(({ isOwn }) => !isOwn);
  return (
    <Page title={helped.length > 0 && own.length === 0 ? "Notebooks you help in." : "Your notebooks."} margin={<Caution />}>
      {journals.length === 0 ? (
        <Empty title="No notebook yet.">
          <p>Start one of your own, or open the invitation that somebody sent you by e-mail.</p>
        </Empty>
      ) : null}
      {own.length > 0 ? <List journals={own} /> : null}
      {helped.length > 0 && own.length > 0 ? <Section title="Notebooks you help in"><List journals={helped} /></Section> : null}
      {helped.length > 0 && own.length === 0 ? <List journals={helped} /> : null}
      <ButtonRow><ButtonLink kind={own.length === 0 && helped.length > 0 ? "other" : "next"} href="/journals/new">Start a journal</ButtonLink></ButtonRow>
    </Page>
  );
}

function List({ journals }: Readonly<{ journals: ReadonlyArray<Journal> }>) {
  return (
    <ul className="mt-6 max-w-text border-t border-hairline">
      {journals.map((journal) => (
        <li key={journal.journalId} className="border-b border-hairline">
          <Link href={`/j/${journal.journalId}/${placeOf(journal)}`} className="flex min-h-target flex-col justify-center py-3">
            <span className="font-semibold">{journal.name}</span>
            <span className="text-note text-soft">{journal.isOwn ? "" : `${journal.ownerName} · `}{ROLE_WORDS[journal.role]}</span>
            <span className="text-note">{standingOf(journal)}</span>
          </Link>
        </li>
      ))}
    </ul>
  );
}

function placeOf({ newest, isOwn, isShared }: Journal): string {
  if (isOwn) return newest ? "today" : "start/about-you";
  return isShared ? "changes" : "today";
}

/** What changed last, for whoever may see it. */
function standingOf({ newest, isShared, timeZone }: Journal): string {
  if (!isShared) return "Settings are not shared with you.";
  if (!newest) return "No version yet.";
  return `Version ${newest.number}: ${STATE_WORDS[newest.state].toLowerCase()} since ${dateText(newest.since, timeZone)}.`;
}
