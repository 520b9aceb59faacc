import "server-only";
import { z } from "zod";
import { listCircle } from "@/db/repositories/grants";
import { listOpenInvitations } from "@/db/repositories/invitations";
import { findJournal } from "@/db/repositories/journals";
import { authorize, type JournalRole, type Scope } from "@/domain/access/policy";
import { isoDayOf } from "@/domain/iso-day";
import { AppError } from "@/domain/errors";
import type { Context } from "@/lib/context";

export type Helper = Readonly<{
  userId: string;
  name: string;
  role: JournalRole;
  scopes: ReadonlyArray<Scope>;
  /** The first and the last day, as ISO dates in the journal's zone; no last one for a grant without end. */
  since: string;
  until: string | null;
}>;

export type OpenInvitation = Readonly<{
  id: string;
  email: string;
  role: JournalRole;
  scopes: ReadonlyArray<Scope>;
  sentOn: string;
  expiresOn: string;
  until: string | null;
}>;

/** Who helps, what each sees and until when, and the invitations that wait. For the person alone. */
export async function circle(
  ctx: Context,
  input: { journalId: string },
): Promise<{ helpers: Helper[]; invitations: OpenInvitation[]; today: string }> {
  const { journalId } = z.object({ journalId: z.uuid() }).parse(input);
  authorize(ctx.actor, "circle.read", journalId);
  const journal = await findJournal(ctx.db, journalId);
  if (!journal) throw new AppError("NOT_FOUND", `journal ${journalId}`);
  const dateOf = (at: Date) => isoDayOf(at, journal.timeZone);
  const lastDay = (end: Date | null) => (end ? dateOf(new Date(end.getTime() - 1)) : null);
  const grants = await listCircle(ctx.db, journalId, ctx.now());
  const invitations = await listOpenInvitations(ctx.db, journalId, ctx.now());
  return {
    today: dateOf(ctx.now()),
    helpers: grants
      .filter(({ role }) => role !== "person")
      .map(({ userId, displayName, role, scopes, grantedAt, expiresAt }) => ({
        userId, name: displayName, role, scopes, since: dateOf(grantedAt), until: lastDay(expiresAt),
      })),
    invitations: invitations.map(({ id, email, role, scopes, createdAt, expiresAt, grantExpiresAt }) => ({
      id, email, role, scopes, sentOn: dateOf(createdAt), expiresOn: dateOf(expiresAt), until: lastDay(grantExpiresAt),
    })),
  };
}
