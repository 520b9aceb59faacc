"use client";

import "./globals.css";
import { ErrorReference } from "@/components/error-reference";
import { Page } from "@/components/page";

/** When not even the frame could be made: a page that stands alone. */
export default function GlobalError({ error, retry }: Readonly<{ error: unknown; retry: () => void }>) {
  return (
    <html lang="en">
      <body className="bg-paper font-sans text-base text-ink">
        <title>Notchbook could not be opened just now</title>
        <main className="px-8 pt-10">
          <Page title="Notchbook could not be opened just now." lead={<p>Nothing you had saved is lost. If you need your way back to the setup before, use the fallback card on paper.</p>}>
            <div className="mt-6"><button type="button" className="button button-next" onClick={retry}>Load it again</button></div>
            <ErrorReference error={error} />
          </Page>
        </main>
      </body>
    </html>
  );
}
