import Link from "next/link";
import type { Letter } from "../queries/mailbox";

const ADDRESS = /(https?:\/\/[^\s\]<>"]+)/;

export type LetterPart = "text" | "html";

/** One part of a letter as it arrived, and the headers that matter. Links work: in the text as links, in the HTML part in a new window. */
export function LetterView({ letter, part }: Readonly<{ letter: Letter; part: LetterPart }>) {
  const headers = Object.entries(letter.headers);
  const words = (is: LetterPart, label: string) =>
    is === part ? <span aria-current="page" className="font-semibold">{label}</span> : <Link className="link" href={`?letter=${letter.id}&part=${is}`}>{label}</Link>;
  return (
    <>
      <p className="mt-6 flex gap-6">{words("text", "Text part")} {words("html", "HTML part")}</p>
      {part === "text" ? <TextPart text={letter.text} /> : <HtmlPart letter={letter} />}
      {headers.length > 0 ? (
        <>
          <h2 className="mt-8 text-section">Headers</h2>
          <dl className="mt-2 text-note">
            {headers.map(([name, value]) => (
              <div key={name} className="border-t border-hairline py-1.5">
                <dt className="text-soft">{name}</dt>
                <dd className="break-all">{value}</dd>
              </div>
            ))}
          </dl>
        </>
      ) : null}
    </>
  );
}

function TextPart({ text }: Readonly<{ text: string }>) {
  return (
    <pre className="mt-4 max-w-text border-l-2 border-hairline pl-4 font-sans break-words whitespace-pre-wrap">
      {text.split(ADDRESS).map((piece, i) => (ADDRESS.test(piece) ? <a key={i} className="link break-all" href={piece}>{piece}</a> : piece))}
    </pre>
  );
}

/** Shut in a frame that runs no script and reaches nothing of the page around it. */
function HtmlPart({ letter }: Readonly<{ letter: Letter }>) {
  return (
    <iframe
      title={`HTML part of “${letter.subject}”`}
      sandbox="allow-popups allow-popups-to-escape-sandbox"
      srcDoc={letter.html}
      className="mt-4 h-[40rem] w-full border border-edge bg-paper"
    />
  );
}
