import "server-only";
import { findAccount } from "@/db/repositories/accounts";
import { upsertGrant } from "@/db/repositories/grants";
import { findOpenInvitation, listInvitationsTo, spendInvitation } from "@/db/repositories/invitations";
import { appendEvent } from "@/db/repositories/journal-events";
import { authorize, requireUser } from "@/domain/access/policy";
import { AppError } from "@/domain/errors";
import type { Context } from "@/lib/context";
import { hashSecret } from "@/lib/secrets";
import { acceptInvitationInput, type AcceptInvitationInput } from "../schema";

/**
 * Come into a circle: by the link of the mail, or by an invitation that waits
 * for the account's address. Either way the account's verified address has to
 * be the one it was sent to. It works once.
 *
 * @throws {AppError} NOT_FOUND for a link that is used up, withdrawn or too old; FORBIDDEN for another address;
 *   CONFLICT for one's own notebook
 */
export async function acceptInvitation(ctx: Context, input: AcceptInvitationInput): Promise<{ journalId: string }> {
  const asked = acceptInvitationInput.parse(input);
  authorize(ctx.actor, "invitation.accept");
  const { userId } = requireUser(ctx.actor);
  const account = await findAccount(ctx.db, userId);
  if (!account) throw new AppError("UNAUTHENTICATED", "no account");

  return ctx.db.transaction(async (tx) => {
    const at = ctx.now();
    const invitation = "token" in asked
      ? await findOpenInvitation(tx, hashSecret(asked.token), at)
      : (await listInvitationsTo(tx, account.email, at)).find(({ journalId, id }) => journalId === asked.journalId && id === asked.invitationId);
    if (!invitation) throw new AppError("NOT_FOUND", "no open invitation");
    if (invitation.email !== account.email) throw new AppError("FORBIDDEN", "sent to another address");
    if (invitation.ownerId === userId) throw new AppError("CONFLICT", "one's own notebook");
    const { journalId, id, role, scopes, invitedBy, grantExpiresAt } = invitation;
    if (!(await spendInvitation(tx, { journalId, id, userId, at }))) throw new AppError("NOT_FOUND", "no open invitation");
    await upsertGrant(tx, { journalId, userId, role, scopes, grantedAt: at, grantedBy: invitedBy, expiresAt: grantExpiresAt });
    await appendEvent(tx, {
      journalId, at, actorId: userId, actorKind: "user", action: "invitation.accept", subject: `invitation ${id}`, details: { role, scopes }, requestId: ctx.requestId,
    });
    return { journalId };
  });
}
