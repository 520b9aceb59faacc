import type { Metadata } from "next";
import { PressButton } from "@/components/form/press-button";
import { Page, Section } from "@/components/page";
import { dateTimeText } from "@/domain/day-text";
import { endSessionAction } from "@/features/account/actions";
import { ChangePasswordForm, LicenceForm, ProfileForm } from "@/features/account/components/forms";
import { ownAccount } from "@/features/account/queries/account";
import { MailChoices } from "@/features/digest/components/mail-choices";
import { forPage } from "@/lib/action";
import { requestContext } from "@/lib/request-context";
import { listSessions } from "@/lib/session";
import { zoneNames } from "@/domain/zone-name";

export const metadata: Metadata = { title: "Account" };

export default async function AccountPage() {
  const account = await forPage(ownAccount);
  const { actor, sessionId } = await requestContext();
  const sessions = actor.type === "user" ? await listSessions(actor.userId) : [];
  return (
    <Page eyebrow={account.email} title="Your account.">
      <Section title="You">
        <ProfileForm start={{ displayName: account.displayName, timeZone: account.timeZone, glucoseUnit: account.glucoseUnit }} zones={zoneNames()} />
      </Section>
      <MailChoices />
      <Section title="Where you are signed in">
        <ul className="max-w-text">
          {sessions.map((session) => (
            <li key={session.id} className="flex flex-wrap items-center justify-between gap-3 border-b border-hairline py-2">
              <span>
                {session.userAgent.slice(0, 60) || "A browser"} <span className="block text-note text-soft">since {dateTimeText(session.createdAt, account.timeZone)}</span>
              </span>
              {session.id === sessionId ? <span className="text-note text-soft">this one</span> : <PressButton action={endSessionAction} label="Sign it out" hidden={{ sessionId: session.id }} look="link" />}
            </li>
          ))}
        </ul>
      </Section>
      <Section title="Password"><ChangePasswordForm /></Section>
      <Section title="If you are a licensed educator">
        <p className="max-w-text">Hand in your licence once. Approvals count while it is verified and valid.</p>
        <LicenceForm />
      </Section>
    </Page>
  );
}
