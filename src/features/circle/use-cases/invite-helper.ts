import "server-only";
import { randomUUID } from "node:crypto";
import { findAccount, findAccountByEmail } from "@/db/repositories/accounts";
import { listCircle } from "@/db/repositories/grants";
import { insertInvitation, withdrawInvitationsTo } from "@/db/repositories/invitations";
import { appendEvent } from "@/db/repositories/journal-events";
import { findJournal } from "@/db/repositories/journals";
import { insertMail } from "@/db/repositories/outbox";
import { grantEnd } from "@/domain/access/grant-end";
import { authorize, requireUser } from "@/domain/access/policy";
import { AppError } from "@/domain/errors";
import { env } from "@/env";
import type { Context } from "@/lib/context";
import { renderMail } from "@/lib/mailer";
import { countAttempt } from "@/lib/rate-limit";
import { hashSecret, newSecret } from "@/lib/secrets";
import { INVITATION_DAYS, ROLE_WORDS } from "../constants";
import { InvitationMail } from "../emails/invitation-mail";
import { inviteHelperInput, type InviteHelperInput } from "../schema";

/**
 * Ask somebody into the circle by e-mail. The link works once, for two weeks;
 * an earlier invitation to the same address is taken back. Whether the address
 * has an account makes no difference and is not told.
 *
 * @throws {AppError} NOT_FOUND, FORBIDDEN, INVALID_INPUT with fields, TOO_MANY
 */
export async function inviteHelper(ctx: Context, input: InviteHelperInput): Promise<{ invitationId: string }> {
  const { journalId, email, role, scopes, until } = inviteHelperInput.parse(input);
  authorize(ctx.actor, "circle.manage", journalId);
  const { userId } = requireUser(ctx.actor);
  const journal = await findJournal(ctx.db, journalId);
  const inviter = await findAccount(ctx.db, userId);
  if (!journal || !inviter) throw new AppError("NOT_FOUND", `journal ${journalId}`);
  await assertNotInCircle(ctx, journalId, email, userId);
  const grantExpiresAt = grantEnd(until, journal.timeZone, ctx.now());
  await countAttempt(ctx.db, "invite", userId);

  const at = ctx.now();
  const secret = newSecret();
  const expiresAt = new Date(at.getTime() + INVITATION_DAYS * 86_400_000);
  const body = await renderMail(
    InvitationMail({ inviterName: inviter.displayName, role: ROLE_WORDS[role], href: `${env.publicOrigin}/invitation?token=${secret}` }),
  );
  return ctx.db.transaction(async (tx) => {
    await withdrawInvitationsTo(tx, journalId, email, at);
    const id = randomUUID();
    await insertInvitation(tx, {
      journalId, id, email, role, scopes, tokenHash: hashSecret(secret), invitedBy: userId, createdAt: at, expiresAt, grantExpiresAt,
    });
    await appendEvent(tx, {
      journalId, at, actorId: userId, actorKind: "user", action: "circle.manage", subject: `invitation ${id}`, details: { step: "invited", role, scopes }, requestId: ctx.requestId,
    });
    await insertMail(tx, {
      ...body, kind: "invitation", journalId, toAddress: email, subject: `${inviter.displayName} asks you into a notebook`,
      dedupeKey: `invitation/${id}`, requestId: ctx.requestId, createdAt: at,
    });
    return { invitationId: id };
  });
}

async function assertNotInCircle(ctx: Context, journalId: string, email: string, ownId: string): Promise<void> {
  const account = await findAccountByEmail(ctx.db, email);
  if (!account) return;
  const members = await listCircle(ctx.db, journalId, ctx.now());
  if (!members.some((member) => member.userId === account.id)) return;
  const sentence = account.id === ownId ? "This is your own address." : "This person is in your circle already. You can change what they see.";
  throw new AppError("INVALID_INPUT", "in the circle already", { email: [sentence] });
}
