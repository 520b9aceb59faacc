import { EmailFrame, EmailText } from "@/components/email-frame";

/** Tells the person that a decision is there; what it says stays in the journal. */
export function DecisionMail({ number, href }: Readonly<{ number: number; href: string }>) {
  return (
    <EmailFrame
      preview="Your educator has looked at your proposal."
      heading={`Your educator has decided on version ${number}`}
      link={{ href, label: "Read the decision" }}
      foot="You get this because you asked your educator to review a version. It holds no settings and no glucose values on purpose."
    >
      <EmailText>The decision and the remarks are in your journal.</EmailText>
    </EmailFrame>
  );
}
