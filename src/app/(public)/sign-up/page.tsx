import type { Metadata } from "next";
import Link from "next/link";
import { Caution } from "@/components/caution";
import { Page } from "@/components/page";
import { SignUpForm } from "@/features/account/components/sign-up-form";
import { zoneNames } from "@/domain/zone-name";

export const metadata: Metadata = { title: "Make an account" };

export default function SignUpPage() {
  return (
    <Page
      title="Make an account."
      lead={<p>Then verify your e-mail address, and start a journal or follow an invitation. <Link className="link" href="/sign-in">I have an account</Link></p>}
      margin={<Caution />}
    >
      <SignUpForm zones={zoneNames()} />
    </Page>
  );
}
