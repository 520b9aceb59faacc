import { Body, Container, Head, Heading, Hr, Html, Link, Preview, Section, Text } from "@react-email/components";
import type { ReactNode } from "react";

const INK = "#1c2230";
const SOFT = "#565b68";
const PAPER = "#faf7f0";
const TEXT = { color: INK, fontSize: "16px", lineHeight: "1.55", margin: "0 0 14px" };

/** The frame of every mail: one column, one heading, one obvious link, the reason for getting it at the foot. */
export function EmailFrame({
  preview, heading, children, link, foot,
}: Readonly<{
  preview: string;
  heading: string;
  children: ReactNode;
  link?: { href: string; label: string };
  foot: ReactNode;
}>) {
  return (
    <Html lang="en">
      <Head>
        <title>{heading}</title>
      </Head>
      <Preview>{preview}</Preview>
      <Body style={{ background: PAPER, fontFamily: "Verdana, Geneva, sans-serif", margin: 0, padding: "24px 0" }}>
        <Container style={{ maxWidth: "560px", borderLeft: `2px solid ${INK}`, padding: "4px 24px" }}>
          <Heading as="h1" style={{ color: INK, fontFamily: "Georgia, serif", fontSize: "24px", lineHeight: "1.25", margin: "0 0 16px" }}>
            {heading}
          </Heading>
          <Section>{children}</Section>
          {link ? (
            <Text style={TEXT}>
              <Link href={link.href} style={{ color: INK, fontWeight: 700, textDecoration: "underline" }}>
                {link.label}
              </Link>
            </Text>
          ) : null}
          <Hr style={{ borderColor: "#d8d1c3", margin: "20px 0 12px" }} />
          <Text style={{ ...TEXT, color: SOFT, fontSize: "13px" }}>{foot}</Text>
        </Container>
      </Body>
    </Html>
  );
}

/** A paragraph of a mail. */
export function EmailText({ children }: Readonly<{ children: ReactNode }>) {
  return <Text style={TEXT}>{children}</Text>;
}
