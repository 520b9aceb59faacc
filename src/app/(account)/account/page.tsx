import type { Metadata } from "next";
import { MarginNote, Page, Section } from "@/components/page";
import { zoneNames } from "@/domain/zone-name";
import { ChangePasswordForm, ProfileForm } from "@/features/account/components/account-forms";
import { LicenceSection } from "@/features/account/components/licence-section";
import { SessionList } from "@/features/account/components/session-list";
import { TokenForm } from "@/features/account/components/token-form";
import { TokenList } from "@/features/account/components/token-list";
import { ownAccount } from "@/features/account/queries/account";
import { ownLicence } from "@/features/account/queries/licence";
import { ownTokens } from "@/features/account/queries/tokens";
import { MailChoices } from "@/features/digest/components/mail-choices";
import { forPage } from "@/lib/action";
import { requestContext } from "@/lib/request-context";
import { listSessions } from "@/lib/session";

export const metadata: Metadata = { title: "Account" };

export default async function AccountPage() {
  const account = await forPage(ownAccount);
  const [tokens, licence, { actor, sessionId }] = await Promise.all([forPage(ownTokens), forPage(ownLicence), requestContext()]);
  const sessions = actor.type === "user" ? await listSessions(actor.userId) : [];
  const { displayName, timeZone, glucoseUnit } = account;
  return (
    <Page
      eyebrow={account.email}
      title="Your account."
      margin={<MarginNote title="What others see"><p>The people in your circle see your name, not your e-mail address, your devices or your tokens.</p></MarginNote>}
    >
      <Section title="You"><ProfileForm start={{ displayName, timeZone, glucoseUnit }} zones={zoneNames()} /></Section>
      <MailChoices />
      <Section title="Password"><ChangePasswordForm /></Section>
      <Section title="Where you are signed in"><SessionList sessions={sessions} presentId={sessionId} timeZone={timeZone} /></Section>
      <Section title="Tokens for your own scripts">
        <p className="mb-3 max-w-text">A script that holds a token can read what you can read here, and with “read and write” also change it. End a token that you no longer use.</p>
        <TokenList tokens={tokens} timeZone={timeZone} />
        <TokenForm />
      </Section>
      <LicenceSection licence={licence} />
    </Page>
  );
}
