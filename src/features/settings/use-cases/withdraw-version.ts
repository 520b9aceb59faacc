import "server-only";
import { appendEvent } from "@/db/repositories/journal-events";
import { findVersionForUpdate, moveVersion } from "@/db/repositories/versions";
import { authorize, requireUser } from "@/domain/access/policy";
import { AppError } from "@/domain/errors";
import { assertEdge } from "@/domain/journal/version-lifecycle";
import type { Context } from "@/lib/context";
import { versionInput } from "../schema";

/** The person takes a version back before it is in effect. It stays in the journal, marked so. @throws {AppError} CONFLICT */
export async function withdrawVersion(ctx: Context, input: { journalId: string; number: number | string }): Promise<{ number: number }> {
  const { journalId, number } = versionInput.parse(input);
  authorize(ctx.actor, "version.withdraw", journalId);
  const { userId } = requireUser(ctx.actor);

  return ctx.db.transaction(async (tx) => {
    const version = await findVersionForUpdate(tx, journalId, number);
    if (!version) throw new AppError("NOT_FOUND", `version ${number}`);
    const at = ctx.now();
    const to = assertEdge(version.state, "withdraw");
    await moveVersion(tx, { journalId, number, from: version.state, to, at });
    await appendEvent(tx, { journalId, at, actorId: userId, actorKind: "user", action: "version.withdraw", subject: `version ${number}`, requestId: ctx.requestId });
    return { number };
  });
}
