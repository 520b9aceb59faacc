import { EmailFrame, EmailText } from "@/components/email-frame";
import { INVITATION_DAYS } from "../constants";

/** Asks somebody into a circle; holds no word about anybody's health. */
export function InvitationMail({ inviterName, role, href }: Readonly<{ inviterName: string; role: string; href: string }>) {
  return (
    <EmailFrame
      preview={`${inviterName} asks you to help, as ${role}.`}
      heading="You are asked into a notebook"
      link={{ href, label: "Look at the invitation" }}
      foot={`You get this because ${inviterName} typed this address in Notchbook. If you do not know why, do nothing: without the link nobody comes in.`}
    >
      <EmailText>
        {inviterName} keeps a notebook in Notchbook, the journal of small changes, and asks you to help as {role}. The page behind
        the link says what would be shared with you. You accept there, or leave it.
      </EmailText>
      <EmailText>The link works once, within {INVITATION_DAYS} days, for an account with this e-mail address.</EmailText>
    </EmailFrame>
  );
}
