import { EmailFrame, EmailText } from "@/components/email-frame";
import { VERIFY_LINK_HOURS } from "../constants";

export function VerifyEmailMail({ name, href }: Readonly<{ name: string; href: string }>) {
  return (
    <EmailFrame
      preview="One press and your account is ready."
      heading="Verify your e-mail address"
      link={{ href, label: "Verify this address" }}
      foot="You get this because somebody made a Notchbook account with this address. If it was not you, do nothing: without this link the account stays closed."
    >
      <EmailText>Hello {name},</EmailText>
      <EmailText>Press the link to say that this address is yours. It works once, within {VERIFY_LINK_HOURS} hours.</EmailText>
    </EmailFrame>
  );
}
