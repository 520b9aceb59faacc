import type { Metadata } from "next";
import { PressButton } from "@/components/form/press-button";
import { Empty } from "@/components/notice";
import { MarginNote, Page, Section } from "@/components/page";
import { counted, isoDateText } from "@/domain/day-text";
import { verifyCredentialAction } from "@/features/administration/actions";
import { serviceHealth } from "@/features/administration/queries/health";
import { forPage } from "@/lib/action";
import { readinessOf } from "@/lib/readiness";

export const metadata: Metadata = { title: "Administration" };

export default async function AdministrationPage() {
  const { accounts, mail, credentials } = await forPage(serviceHealth);
  const why = await readinessOf();
  return (
    <Page
      title={credentials.length === 0 ? "No licence waits." : `${counted(credentials.length, "licence waits", "licences wait")} to be verified.`}
      margin={<MarginNote title="What you don’t see"><p>No journal, no glucose, no settings. An administrator has no way into health data.</p></MarginNote>}
    >
      <Section title="Licences to verify">
        {credentials.length === 0 ? <Empty title="All were looked at."><p>When an educator hands in a licence it stands here. Their approvals count only once you have checked it.</p></Empty> : (
          <ul className="max-w-text">
            {credentials.map((c) => (
              <li key={c.userId} className="flex flex-wrap items-center justify-between gap-3 border-b border-hairline py-3">
                <span>{c.displayName}, {c.profession}, licence {c.licenceNumber}, {c.jurisdiction}, valid until {isoDateText(c.expiresOn)}</span>
                <PressButton action={verifyCredentialAction} label="I have checked this licence" hidden={{ userId: c.userId }} />
              </li>
            ))}
          </ul>
        )}
      </Section>
      <Section title="The service">
        <table className="table max-w-text">
          <tbody>
            <tr><th scope="row">Ready to serve</th><td>{why === null ? "yes" : `no: ${why}`}</td></tr>
            <tr><th scope="row">Accounts</th><td>{accounts.all}, {accounts.verified} with a verified address</td></tr>
            {mail.map((m) => <tr key={`${m.state}-${m.kind}`}><th scope="row">Mail, {m.kind.replaceAll("-", " ")}</th><td>{m.count} {m.state}</td></tr>)}
          </tbody>
        </table>
      </Section>
    </Page>
  );
}
