import { EmailFrame, EmailText } from "@/components/email-frame";

export function PasswordChangedMail({ signedOut }: Readonly<{ signedOut: string }>) {
  return (
    <EmailFrame
      preview={signedOut}
      heading="Your password was changed"
      foot="You get this because the password of your account was changed. If it was not you, choose a new one at once from the sign-in page."
    >
      <EmailText>{signedOut} Sign in with the new password.</EmailText>
    </EmailFrame>
  );
}
