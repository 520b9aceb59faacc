import type { Letter } from "../queries/mailbox";

const ADDRESS = /(https?:\/\/[^\s\]<>"]+)/;

/** A letter as it arrived: its text with working links, the HTML part shut in a frame, and the headers that matter. */
export function LetterView({ letter }: Readonly<{ letter: Letter }>) {
  const headers = Object.entries(letter.headers);
  return (
    <>
      <h3 className="mt-6 font-sans text-base font-semibold">Text part</h3>
      <pre className="mt-2 border-l-2 border-hairline pl-4 font-sans break-words whitespace-pre-wrap">
        {letter.text.split(ADDRESS).map((piece, i) => (ADDRESS.test(piece) ? <a key={i} className="link break-all" href={piece}>{piece}</a> : piece))}
      </pre>
      <h3 className="mt-6 font-sans text-base font-semibold">HTML part</h3>
      <iframe
        title={`HTML part of “${letter.subject}”`}
        sandbox="allow-popups allow-popups-to-escape-sandbox"
        srcDoc={letter.html}
        className="mt-2 h-[34rem] w-full border border-edge bg-paper"
      />
      {headers.length > 0 ? (
        <>
          <h3 className="mt-6 font-sans text-base font-semibold">Headers</h3>
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
