import type { Metadata } from "next";
import Link from "next/link";
import { Page } from "@/components/page";
import { UnsubscribeForm } from "@/features/digest/components/unsubscribe-form";

export const metadata: Metadata = { title: "Weekly mails", referrer: "same-origin" };

type Search = Readonly<{ searchParams: Promise<{ token?: string | string[]; done?: string | string[] }> }>;

/** Opening the page changes nothing: programs that follow links do that too. The button does it. */
export default async function UnsubscribePage({ searchParams }: Search) {
  const { token, done } = await searchParams;
  if (done === "yes") {
    return <Page title="No more weekly mails." lead={<p>You can have them again at any time on <Link className="link" href="/account#mail">your account page</Link>.</p>} />;
  }
  if (typeof token !== "string" || token === "") {
    return <Page title="End the weekly mails." lead={<p>Open this page by the link at the foot of one of them, or change your choice on <Link className="link" href="/account#mail">your account page</Link>.</p>} />;
  }
  return (
    <Page title="End the weekly mails?" lead={<p>Your notebooks stay as they are. One press, without signing in.</p>}>
      <UnsubscribeForm token={token} />
    </Page>
  );
}
