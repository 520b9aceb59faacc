import "server-only";
import { z } from "zod";
import { findAccount } from "@/db/repositories/accounts";
import { findOpenInvitation, listInvitationsTo } from "@/db/repositories/invitations";
import { authorize, requireUser, type JournalRole, type Scope } from "@/domain/access/policy";
import type { Context } from "@/lib/context";
import { hashSecret } from "@/lib/secrets";

export type ShownInvitation = Readonly<{
  journalId: string;
  id: string;
  email: string;
  role: JournalRole;
  scopes: ReadonlyArray<Scope>;
  inviterName: string;
  expiresAt: Date;
  grantExpiresAt: Date | null;
}>;

/** How the reader stands to an invitation: only "may-accept" can press the button. */
export type Standing = "signed-out" | "unverified" | "other-address" | "may-accept";

type Row = Awaited<ReturnType<typeof listInvitationsTo>>[number];

const shown = ({ journalId, id, email, role, scopes, inviterName, expiresAt, grantExpiresAt }: Row): ShownInvitation => ({
  journalId, id, email, role, scopes, inviterName, expiresAt, grantExpiresAt,
});

/**
 * What the link of an invitation leads to, for whoever holds it.
 *
 * @returns `null` for a link that is used up, withdrawn, too old, or not ours: they are not told apart
 */
export async function invitationByLink(
  ctx: Context,
  input: { token: string },
): Promise<{ invitation: ShownInvitation; standing: Standing; ownAddress: string | null } | null> {
  const { token } = z.object({ token: z.string().max(200) }).parse(input);
  authorize(ctx.actor, "account.enter");
  const row = await findOpenInvitation(ctx.db, hashSecret(token), ctx.now());
  if (!row) return null;
  const account = ctx.actor.type === "user" ? await findAccount(ctx.db, ctx.actor.userId) : undefined;
  return { invitation: shown(row), standing: standingOf(row.email, account), ownAddress: account?.email ?? null };
}

function standingOf(email: string, account: Awaited<ReturnType<typeof findAccount>>): Standing {
  if (!account) return "signed-out";
  if (account.email !== email) return "other-address";
  return account.emailVerifiedAt ? "may-accept" : "unverified";
}

/** The invitations that wait for the signed-in account's verified address. */
export async function waitingInvitations(ctx: Context): Promise<ShownInvitation[]> {
  authorize(ctx.actor, "invitation.accept");
  const account = await findAccount(ctx.db, requireUser(ctx.actor).userId);
  return account ? (await listInvitationsTo(ctx.db, account.email, ctx.now())).map(shown) : [];
}
