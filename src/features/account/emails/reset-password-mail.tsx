import { EmailFrame, EmailText } from "@/components/email-frame";
import { RESET_LINK_MINUTES } from "../constants";

export function ResetPasswordMail({ href }: Readonly<{ href: string }>) {
  return (
    <EmailFrame
      preview="A link to choose a new password."
      heading="Choose a new password"
      link={{ href, label: "Choose a new password" }}
      foot="You get this because somebody asked for a new password with this address. If it was not you, do nothing: your password stays as it is."
    >
      <EmailText>The link works once, within {RESET_LINK_MINUTES} minutes.</EmailText>
    </EmailFrame>
  );
}
