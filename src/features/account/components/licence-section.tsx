import { Section } from "@/components/page";
import { isoDateText } from "@/domain/day-text";
import { LicenceForm } from "./account-forms";

type Licence = Readonly<{
  profession: string; licenceNumber: string; jurisdiction: string; expiresOn: string; state: "over" | "verified" | "waiting";
}>;

/** For educators: where the own licence stands, and the form to hand one in. */
export function LicenceSection({ licence }: Readonly<{ licence: Licence | null }>) {
  return (
    <Section title="If you are a licensed educator" id="licence">
      {licence ? (
        <>
          <p className="max-w-text">{licence.profession}, licence {licence.licenceNumber}, {licence.jurisdiction}. {stateText(licence)}</p>
          <details className="mt-2" open={licence.state === "over"}>
            <summary className="inline-flex min-h-target items-center"><span className="link">Hand in a new one</span></summary>
            <p className="max-w-text">A new one takes the place of this one. Until an administrator has verified it, your approvals don’t count.</p>
            <LicenceForm start={{ profession: licence.profession, licenceNumber: licence.licenceNumber, jurisdiction: licence.jurisdiction, expiresOn: licence.expiresOn }} />
          </details>
        </>
      ) : (
        <>
          <p className="max-w-text">Hand in your licence once. Approvals count while it is verified and valid.</p>
          <LicenceForm start={{}} />
        </>
      )}
    </Section>
  );
}

function stateText({ state, expiresOn }: Licence): string {
  const day = isoDateText(expiresOn);
  if (state === "over") return `It ran out on ${day}; approvals wait for a new one.`;
  return state === "verified" ? `Verified, valid until ${day}.` : "It waits for an administrator to verify it.";
}
