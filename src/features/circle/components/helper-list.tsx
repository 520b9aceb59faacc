import { longDateText } from "@/domain/digest/date-text";
import type { Scope } from "@/domain/access/policy";
import { removeHelperAction, withdrawInvitationAction } from "../actions";
import { ROLE_WORDS, SCOPE_OPTIONS } from "../constants";
import type { Helper, OpenInvitation } from "../queries/circle";
import { LimitForm } from "./limit-form";
import { PressForm } from "./press-form";

/** What is shared, in words: "settings, glucose and comparisons, notes". */
export function scopesText(scopes: ReadonlyArray<Scope>): string {
  const words = SCOPE_OPTIONS.filter(({ value }) => scopes.includes(value)).map(({ inSentence }) => inSentence);
  return words.length > 0 ? words.join(", ") : "nothing but the name of the notebook";
}

/** Everybody who helps, with what they see; each can be limited or removed here. */
export function HelperList({ journalId, helpers }: Readonly<{ journalId: string; helpers: ReadonlyArray<Helper> }>) {
  return (
    <ul className="max-w-text">
      {helpers.map(({ userId, name, role, scopes, since, until }) => (
        <li key={userId} className="border-t border-hairline py-4">
          <h3 className="text-base">{name}, {ROLE_WORDS[role]}</h3>
          <p className="mt-1">Sees {scopesText(scopes)}.</p>
          <p className="text-note text-soft">
            Since {longDateText(since)} · {until ? `until ${longDateText(until)}` : "no end"}
          </p>
          <details className="mt-1">
            <summary className="inline-flex min-h-target items-center"><span className="link">Change what {name} sees</span></summary>
            <LimitForm key={`${scopes.join()} ${until}`} journalId={journalId} userId={userId} scopes={scopes} until={until} />
          </details>
          <PressForm action={removeHelperAction} label={`Remove ${name}`} hidden={{ journalId, userId }} kind="other" />
        </li>
      ))}
    </ul>
  );
}

/** The invitations that nobody has accepted yet. */
export function InvitationList({ journalId, invitations }: Readonly<{ journalId: string; invitations: ReadonlyArray<OpenInvitation> }>) {
  return (
    <ul className="max-w-text">
      {invitations.map(({ id, email, role, scopes, sentOn, expiresOn, until }) => (
        <li key={id} className="border-t border-hairline py-4">
          <h3 className="text-base break-all">{email}</h3>
          <p className="mt-1">As {ROLE_WORDS[role]}, to see {scopesText(scopes)}{until ? `, until ${longDateText(until)}` : ""}.</p>
          <p className="text-note text-soft">Sent {longDateText(sentOn)} · the link works until {longDateText(expiresOn)}</p>
          <PressForm action={withdrawInvitationAction} label="Take it back" hidden={{ journalId, invitationId: id }} kind="other" />
        </li>
      ))}
    </ul>
  );
}
