import type { Metadata } from "next";
import { Page } from "@/components/page";
import { VerifyForm } from "@/features/account/components/entry-forms";

export const metadata: Metadata = { title: "Verify your address", referrer: "no-referrer" };

export default async function VerifyEmailPage({ searchParams }: Readonly<{ searchParams: Promise<{ token?: string }> }>) {
  const { token } = await searchParams;
  return (
    <Page title="One press to verify." lead={<p>Press the button to say that this e-mail address is yours.</p>}>
      <VerifyForm token={typeof token === "string" ? token : ""} />
    </Page>
  );
}
