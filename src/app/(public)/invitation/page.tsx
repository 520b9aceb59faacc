import type { Metadata } from "next";
import Link from "next/link";
import { ButtonLink, ButtonRow } from "@/components/button";
import { Empty } from "@/components/notice";
import { MarginNote, Page } from "@/components/page";
import { acceptInvitationAction } from "@/features/circle/actions";
import { InvitationTerms, WaitingInvitations } from "@/features/circle/components/invitation-card";
import { PressForm } from "@/features/circle/components/press-form";
import { invitationByLink, waitingInvitations } from "@/features/circle/queries/invitation";
import { forPage } from "@/lib/action";

export const metadata: Metadata = { title: "Invitation", referrer: "same-origin" };

type Search = Readonly<{ searchParams: Promise<{ token?: string | string[] }> }>;

const MARGIN = (
  <MarginNote title="Before you accept">
    <p>You see only what is listed, and each look stands in a log that the other can read. Nothing you write here is medical advice, and you can leave at any time.</p>
  </MarginNote>
);

export default async function InvitationPage({ searchParams }: Search) {
  const { token } = await searchParams;
  return typeof token === "string" && token ? <ByLink token={token} /> : <Waiting />;
}

async function ByLink({ token }: Readonly<{ token: string }>) {
  const found = await forPage((ctx) => invitationByLink(ctx, { token }));
  if (!found) {
    return (
      <Page title="This invitation is no longer open.">
        <Empty title="It was used, taken back, or is older than two weeks.">
          <p>Ask the person who sent it for a new one. If you accepted it already, the notebook stands among <Link className="link" href="/journals">your journals</Link>.</p>
        </Empty>
      </Page>
    );
  }
  const { invitation, standing, ownAddress } = found;
  const back = encodeURIComponent(`/invitation?token=${token}`);
  return (
    <Page title={`${invitation.inviterName} asks you into a notebook.`} margin={MARGIN}>
      <InvitationTerms invitation={invitation} />
      {standing === "signed-out" ? (
        <>
          <p className="mt-6 max-w-text">Sign in with the address it was sent to. New here? Make an account with that address and verify it; the invitation then waits for you.</p>
          <ButtonRow>
            <ButtonLink kind="next" href={`/sign-in?next=${back}`}>Sign in</ButtonLink>
            <ButtonLink href={`/sign-up?next=${back}`}>Make an account</ButtonLink>
          </ButtonRow>
        </>
      ) : null}
      {standing === "may-accept" ? <PressForm action={acceptInvitationAction} label="Accept" hidden={{ token }} /> : null}
      {standing === "unverified" ? (
        <p className="mt-6 max-w-text">First verify your e-mail address: <Link className="link" href="/check-your-mail">open the link in the mail we sent</Link>. Then come back here.</p>
      ) : null}
      {standing === "other-address" ? (
        <p className="mt-6 max-w-text">It was sent to {invitation.email}, and you are signed in as {ownAddress}. Sign in with that address, or ask {invitation.inviterName} to invite {ownAddress}.</p>
      ) : null}
    </Page>
  );
}

async function Waiting() {
  const invitations = await forPage((ctx) => waitingInvitations(ctx));
  return (
    <Page title={invitations.length > 0 ? "You are asked into a notebook." : "No invitation waits for you."} margin={invitations.length > 0 ? MARGIN : undefined}>
      {invitations.length > 0 ? (
        <WaitingInvitations invitations={invitations} />
      ) : (
        <Empty title="Invitations are sent to one e-mail address.">
          <p>Ask the person you help to invite the address of this account.</p>
        </Empty>
      )}
    </Page>
  );
}
