import { Section } from "@/components/page";
import { forPage } from "@/lib/action";
import { lentFinding } from "@/lib/lent-findings";
import { digestPreview } from "../queries/digest-preview";
import { DigestPreferencesForm } from "./digest-preferences-form";
import { DigestPreview } from "./digest-preview";
import { SendNowForm } from "./send-now-form";

/** The part of the account page about mail: the choice, what it would look like, and one now. */
export async function MailChoices() {
  const { preference, digest, timeZone } = await forPage((ctx) => digestPreview(ctx, lentFinding));
  return (
    <Section title="Mail" id="mail">
      <DigestPreferencesForm preference={preference} timeZone={timeZone} />
      {digest ? (
        <>
          <details className="mt-6">
            <summary className="inline-flex min-h-target items-center"><span className="link">What the last seven days would look like</span></summary>
            <DigestPreview digest={digest} />
          </details>
          <SendNowForm />
        </>
      ) : null}
    </Section>
  );
}
