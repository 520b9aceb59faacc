import { EmailFrame, EmailText } from "@/components/email-frame";

export function PasswordChangedMail() {
  return (
    <EmailFrame
      preview="All devices were signed out."
      heading="Your password was changed"
      foot="You get this because the password of your account was changed. If it was not you, choose a new one at once from the sign-in page."
    >
      <EmailText>Every device was signed out. Sign in with the new password.</EmailText>
    </EmailFrame>
  );
}
