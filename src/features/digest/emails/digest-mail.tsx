import { Heading, Link } from "@react-email/components";
import { EmailFrame, EmailText } from "@/components/email-frame";
import type { Digest, DigestPart, DigestSection } from "@/domain/digest/week";

const INK = "#1c2230";
const HEADING = { color: INK, fontFamily: "Georgia, serif", fontSize: "20px", lineHeight: "1.3", margin: "26px 0 8px" };
const PART = { color: INK, fontSize: "16px", lineHeight: "1.4", margin: "14px 0 4px" };
const LIST = { color: INK, fontSize: "16px", lineHeight: "1.55", margin: "0", padding: "0 0 0 20px" };
const PLAIN_LINK = { color: "inherit", textDecoration: "underline" };

/** A reader's week. Both parts of the mail are complete: the text is made from this same tree. */
export function DigestMail({
  digest, name, origin, unsubscribeHref,
}: Readonly<{ digest: Digest; name: string; origin: string; unsubscribeHref: string }>) {
  return (
    <EmailFrame
      preview={digest.preview}
      heading={digest.heading}
      foot={
        <>
          You get this once a week because you keep or help with a notebook in Notchbook. It is not medical advice: a licensed
          professional who knows the person decides.
          <br />
          <Link style={PLAIN_LINK} href={`${origin}/account#mail`}>Choose how much, and when</Link>
          <br />
          <Link style={PLAIN_LINK} href={unsubscribeHref}>End these weekly mails</Link>
        </>
      }
    >
      <EmailText>Hello {name}, this is about {digest.preview}.</EmailText>
      {digest.sections.map((section) => <Notebook key={`${section.heading}${section.path}`} section={section} origin={origin} />)}
    </EmailFrame>
  );
}

function Notebook({ section, origin }: Readonly<{ section: DigestSection; origin: string }>) {
  return (
    <>
      <Heading as="h2" style={HEADING}>{section.heading}</Heading>
      {section.parts.map((part) => <Part key={part.title} part={part} />)}
      <EmailText>
        <Link href={`${origin}${section.path}`} style={{ color: INK, fontWeight: 700, textDecoration: "underline" }}>{section.pathLabel}</Link>
      </EmailText>
    </>
  );
}

function Part({ part }: Readonly<{ part: DigestPart }>) {
  return (
    <>
      <Heading as="h3" style={PART}>{part.title}</Heading>
      <ul style={LIST}>
        {part.lines.map((line) => <li key={line} style={{ margin: "0 0 6px" }}>{line}</li>)}
      </ul>
    </>
  );
}
