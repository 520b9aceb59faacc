import "server-only";
import { listVersions } from "@/db/repositories/versions";
import { authorize } from "@/domain/access/policy";
import type { SettingsProfile } from "@/domain/settings/profile";
import type { Context } from "@/lib/context";
import { journalInput } from "../schema";

/** The version a change would start from; null while there is none in effect or another waits. */
export async function newChange(ctx: Context, input: { journalId: string }): Promise<{ number: number; profile: SettingsProfile } | null> {
  const { journalId } = journalInput.parse(input);
  authorize(ctx.actor, "version.propose", journalId);
  const versions = await listVersions(ctx.db, journalId);
  const isWaiting = versions.some((v) => v.state === "proposed" || v.state === "approved" || v.state === "returned");
  const current = versions.find((v) => v.state === "in-effect");
  return current && !isWaiting ? { number: current.number, profile: current.profile } : null;
}
