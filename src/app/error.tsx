"use client";

import { Page } from "@/components/page";
import { Shell } from "@/components/shell";

/** Something of ours broke. The digest names the line in the log; nothing of the cause is shown. */
export default function ErrorPage({ error, reset }: Readonly<{ error: Error & { digest?: string }; reset: () => void }>) {
  return (
    <Shell home="/" words={[]} more={[{ href: "/help", label: "Help", isCurrent: false }]}>
      <Page title="This page could not be made just now." lead={<p>Nothing you had saved is lost. {error.digest ? `Reference ${error.digest}.` : ""}</p>}>
        <div className="mt-6"><button type="button" className="button button-next" onClick={reset}>Load it again</button></div>
      </Page>
    </Shell>
  );
}
