import "server-only";
import { listJournalsOf } from "@/db/repositories/grants";
import { listVersions } from "@/db/repositories/versions";
import { authorize, can, requireUser } from "@/domain/access/policy";
import type { Context } from "@/lib/context";

/** Own journals and those one helps in, each with how its newest version stands where settings are shared. */
export async function myJournals(ctx: Context) {
  authorize(ctx.actor, "journal.list");
  const { userId } = requireUser(ctx.actor);
  const journals = await listJournalsOf(ctx.db, userId, ctx.now());
  return Promise.all(
    journals.map(async (journal) => {
      const isShared = can(ctx.actor, "version.read", journal.journalId);
      const [newest] = isShared ? await listVersions(ctx.db, journal.journalId) : [];
      return {
        ...journal,
        isOwn: journal.role === "person",
        isShared,
        newest: newest ? { number: newest.number, state: newest.state, since: newest.stateSince } : null,
      };
    }),
  );
}
