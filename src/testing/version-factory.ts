import type { Pool } from "@/db/client";
import { insertVersion, moveVersion } from "@/db/repositories/versions";
import type { VersionState } from "@/domain/journal/version-lifecycle";
import { exampleProfile } from "@/domain/settings/profile.fixture";
import { TEST_NOW } from "./factories";

/** A version as it stands at `at`: straight into a state, or into effect from then on. */
export async function createVersion(
  db: Pool,
  given: {
    journalId: string; authorId: string; number: number; state?: VersionState; at?: Date; basalMilliUnitsPerHour?: number;
    parentNumber?: number | null; lookAgainOn?: string; reviewOn?: string;
  },
): Promise<void> {
  const { journalId, number, authorId, state = "in-effect", at = TEST_NOW } = given;
  const parentNumber = given.parentNumber === undefined ? (number > 1 ? number - 1 : null) : given.parentNumber;
  const profile = exampleProfile({ basal: [{ startMinute: 0, milliUnitsPerHour: given.basalMilliUnitsPerHour ?? 500 }] });
  await insertVersion(
    db,
    {
      journalId, number, revision: 1, parentNumber, kind: parentNumber === null ? "starting" : "change", profile, contentHash: `hash-${number}`,
      reasonCode: "pattern-high", reasonText: "", evidenceDays: [], revertRule: "", guardrails: [], authorId, createdAt: at,
      lookAgainOn: given.lookAgainOn ?? null,
    },
    state === "in-effect" ? "approved" : state,
  );
  if (state === "in-effect") {
    await moveVersion(db, { journalId, number, from: "approved", to: "in-effect", at }, { effectiveFrom: at, reviewOn: given.reviewOn ?? null });
  }
}
