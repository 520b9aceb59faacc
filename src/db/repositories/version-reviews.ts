import { asc, eq } from "drizzle-orm";
import type { Db } from "@/db/client";
import { users } from "@/db/schema/people";
import { versionReviews } from "@/db/schema/settings";

/** Append a signed decision. It is bound to the content hash the educator was shown and never rewritten. */
export async function insertReview(tx: Db, review: typeof versionReviews.$inferInsert): Promise<void> {
  await tx.insert(versionReviews).values(review);
}

/** All decisions in a journal, oldest first, with the name of who decided. */
export async function listReviews(db: Db, journalId: string) {
  return db
    .select({
      number: versionReviews.number,
      revision: versionReviews.revision,
      decision: versionReviews.decision,
      reviewerName: users.displayName,
      contentHash: versionReviews.contentHash,
      signOffText: versionReviews.signOffText,
      reasonCode: versionReviews.reasonCode,
      remarks: versionReviews.remarks,
      reviewOn: versionReviews.reviewOn,
      at: versionReviews.at,
    })
    .from(versionReviews)
    .innerJoin(users, eq(users.id, versionReviews.reviewerId))
    .where(eq(versionReviews.journalId, journalId))
    .orderBy(asc(versionReviews.at));
}
