import type { Metadata } from "next";
import Link from "next/link";
import { Page } from "@/components/page";
import { env } from "@/env";
import { ResendForm } from "@/features/account/components/entry-forms";
import { requestContext } from "@/lib/request-context";

export const metadata: Metadata = { title: "Check your mail" };

export default async function CheckYourMailPage() {
  const { actor } = await requestContext();
  return (
    <Page
      title="Check your mail."
      lead={
        <>
          <p>A link is on its way. Press it to say that the address is yours; then the journal opens. It works within two days, once.</p>
          {env.isDemo ? <p className="mt-2">This server keeps its mail to itself: <Link className="link" href="/developer/mailbox">open the local mailbox</Link>.</p> : null}
        </>
      }
    >
      {actor.type === "user" ? <ResendForm /> : <p className="mt-5"><Link className="link" href="/sign-in">Sign in to have it sent again</Link></p>}
    </Page>
  );
}
