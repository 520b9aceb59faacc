import type { Metadata } from "next";
import { Page } from "@/components/page";
import { RequestResetForm, ResetPasswordForm } from "@/features/account/components/entry-forms";

export const metadata: Metadata = { title: "A new password", referrer: "no-referrer" };

export default async function ResetPasswordPage({ searchParams }: Readonly<{ searchParams: Promise<{ token?: string }> }>) {
  const { token } = await searchParams;
  if (typeof token === "string") {
    return (
      <Page title="Choose a new password." lead={<p>Every device is signed out by it. Then sign in with the new one.</p>}>
        <ResetPasswordForm token={token} />
      </Page>
    );
  }
  return (
    <Page title="Have a link sent." lead={<p>Type the address of your account. The link lets you choose a new password.</p>}>
      <RequestResetForm />
    </Page>
  );
}
