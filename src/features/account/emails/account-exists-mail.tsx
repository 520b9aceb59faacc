import { EmailFrame, EmailText } from "@/components/email-frame";

export function AccountExistsMail({ href }: Readonly<{ href: string }>) {
  return (
    <EmailFrame
      preview="Somebody tried to make a second account with this address."
      heading="You already have an account"
      link={{ href, label: "Choose a new password" }}
      foot="You get this because somebody typed this address on the sign-up page. If it was not you, do nothing: your account is as it was."
    >
      <EmailText>There is a Notchbook account with this address. If you don’t know its password any more, choose a new one.</EmailText>
    </EmailFrame>
  );
}
