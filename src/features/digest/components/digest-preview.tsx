import Link from "next/link";
import type { Digest } from "@/domain/digest/week";

/** A reader's week as the mail would tell it. */
export function DigestPreview({ digest }: Readonly<{ digest: Digest }>) {
  return (
    <div className="mt-4 max-w-text border-l-2 border-ink pl-5">
      <p className="text-note text-soft">Subject: {digest.subject} · {digest.preview}</p>
      {digest.sections.map((section) => (
        <section key={`${section.heading}${section.path}`} className="mt-4">
          <h3 className="text-base">{section.heading}</h3>
          {section.parts.map((part) => (
            <div key={part.title} className="mt-2">
              <h4 className="font-semibold">{part.title}</h4>
              <ul className="list-disc pl-5">{part.lines.map((line) => <li key={line}>{line}</li>)}</ul>
            </div>
          ))}
          <p className="mt-2"><Link className="link" href={section.path}>{section.pathLabel}</Link></p>
        </section>
      ))}
    </div>
  );
}
