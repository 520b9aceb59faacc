import type { Metadata } from "next";
import Link from "next/link";
import { Page, Section } from "@/components/page";
import { env } from "@/env";
import { DemoButtons } from "@/features/account/components/demo-buttons";
import { SignInForm } from "@/features/account/components/entry-forms";

export const metadata: Metadata = { title: "Sign in" };

export default async function SignInPage({ searchParams }: Readonly<{ searchParams: Promise<{ next?: string }> }>) {
  const { next } = await searchParams;
  return (
    <Page title="Sign in." lead={<p>New here? <Link className="link" href="/sign-up">Make an account</Link></p>}>
      <SignInForm next={typeof next === "string" ? next : ""} />
      <p className="mt-5"><Link className="link" href="/reset-password">I don’t know my password any more</Link></p>
      {env.isDemo ? <Section title="Or look around with invented data"><DemoButtons /></Section> : null}
    </Page>
  );
}
