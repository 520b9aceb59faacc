import type { Metadata } from "next";
import Link from "next/link";
import { Empty } from "@/components/notice";
import { Page } from "@/components/page";
import { momentText } from "@/domain/digest/date-text";
import { LetterView, type LetterPart } from "@/features/digest/components/letter-view";
import { mailbox, type Letter } from "@/features/digest/queries/mailbox";
import { forPage } from "@/lib/action";

export const metadata: Metadata = { title: "Local mailbox", referrer: "same-origin" };

type Search = Readonly<{ searchParams: Promise<{ letter?: string | string[]; part?: string | string[] }> }>;

export default async function MailboxPage({ searchParams }: Search) {
  const { letter: wanted, part } = await searchParams;
  const letters = await forPage((ctx) => mailbox(ctx));
  const letter = letters.find(({ id }) => id === wanted);
  return letter ? <OneLetter letter={letter} part={part === "html" ? "html" : "text"} /> : <AllLetters letters={letters} />;
}

function OneLetter({ letter, part }: Readonly<{ letter: Letter; part: LetterPart }>) {
  return (
    <Page eyebrow={<Link className="link" href="/developer/mailbox">Local mailbox</Link>} title={letter.subject} lead={<LetterLine letter={letter} />}>
      <LetterView letter={letter} part={part} />
    </Page>
  );
}

function AllLetters({ letters }: Readonly<{ letters: ReadonlyArray<Letter> }>) {
  return (
    <Page
      title={letters.length === 1 ? "One letter in the local mailbox." : `${letters.length} letters in the local mailbox.`}
      lead={<p>The demo sends nothing out. What it would have sent to anybody stands here, newest first.</p>}
    >
      {letters.length === 0 ? (
        <Empty title="No letter yet.">
          <p>Make an account, invite a helper or write a comment; the letter arrives here within seconds.</p>
        </Empty>
      ) : (
        <ul className="mt-6 max-w-text">
          {letters.map((letter) => (
            <li key={letter.id} className="border-t border-hairline">
              <Link href={`/developer/mailbox?letter=${letter.id}`} className="block py-2.5">
                <span className="link font-semibold">{letter.subject}</span>
                <LetterLine letter={letter} />
              </Link>
            </li>
          ))}
        </ul>
      )}
    </Page>
  );
}

function LetterLine({ letter }: Readonly<{ letter: Letter }>) {
  return (
    <span className="block text-note break-words text-soft">
      To {letter.to.join(", ")} · <time dateTime={letter.receivedAt}>{momentText(new Date(letter.receivedAt), "UTC")} UTC</time>
    </span>
  );
}
