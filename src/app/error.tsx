"use client";

import { ErrorReference } from "@/components/error-reference";
import { StopPage } from "@/components/stop-page";

/** Something of ours broke. The reference finds the line in the log; nothing of the cause is shown. */
export default function ErrorPage({ error, retry }: Readonly<{ error: unknown; retry: () => void }>) {
  return (
    <StopPage title="This page could not be made just now." lead={<p>Nothing you had saved is lost. Load the page again in a moment.</p>}>
      <div className="mt-6"><button type="button" className="button button-next" onClick={retry}>Load it again</button></div>
      <ErrorReference error={error} />
    </StopPage>
  );
}
