import { longDateText } from "@/domain/digest/date-text";
import { isoDayOf } from "@/domain/iso-day";
import { acceptInvitationAction } from "../actions";
import { ROLE_WORDS } from "../constants";
import type { ShownInvitation } from "../queries/invitation";
import { scopesText } from "./helper-list";
import { PressForm } from "./press-form";

/** What an invitation offers: by whom, as what, to see what, until when. */
export function InvitationTerms({ invitation }: Readonly<{ invitation: ShownInvitation }>) {
  const { inviterName, role, scopes, email, expiresAt, grantExpiresAt } = invitation;
  const day = (at: Date) => longDateText(isoDayOf(at, "UTC"));
  return (
    <dl className="mt-4 max-w-text">
      {[
        ["From", inviterName],
        ["As", ROLE_WORDS[role]],
        ["You would see", scopesText(scopes)],
        ["Until", grantExpiresAt ? day(new Date(grantExpiresAt.getTime() - 1)) : "no end, until one of you ends it"],
        ["Sent to", email],
        ["Open until", day(expiresAt)],
      ].map(([label, value]) => (
        <div key={label} className="border-t border-hairline py-2 desk:grid desk:grid-cols-[9rem_1fr]">
          <dt className="text-note text-soft desk:text-base">{label}</dt>
          <dd className="break-words">{value}</dd>
        </div>
      ))}
    </dl>
  );
}

/** The invitations that wait for the reader's own address, each with its button. */
export function WaitingInvitations({ invitations }: Readonly<{ invitations: ReadonlyArray<ShownInvitation> }>) {
  return invitations.map((invitation) => (
    <div key={invitation.id} className="mt-6">
      <InvitationTerms invitation={invitation} />
      <PressForm action={acceptInvitationAction} label="Accept" hidden={{ journalId: invitation.journalId, invitationId: invitation.id }} />
    </div>
  ));
}
