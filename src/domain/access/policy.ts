import { AppError } from "@/domain/errors";
import { PERMITTED, type Action, type Scope, type JournalRole } from "./permissions";

export type { Action, JournalRole, Scope } from "./permissions";

export type Grant = Readonly<{ journalId: string; role: JournalRole; scopes: ReadonlyArray<Scope> }>;

/** Who asks. Built from the database for every request, never from a cookie. */
export type Actor =
  | Readonly<{ type: "anonymous" }>
  | Readonly<{
      type: "user";
      userId: string;
      isEmailVerified: boolean;
      isAdministrator: boolean;
      /** An educator's licence that an administrator verified and that has not run out. */
      isLicensed: boolean;
      grants: ReadonlyArray<Grant>;
    }>
  | Readonly<{ type: "job"; job: "weekly-digest" | "outbox" }>;

/** The live grant on one journal, if any. */
export function findGrant(actor: Actor, journalId: string): Grant | undefined {
  return actor.type === "user" ? actor.grants.find((g) => g.journalId === journalId) : undefined;
}

/** Whether the actor may perform `action`, on one journal where the action concerns one. */
export function can(actor: Actor, action: Action, journalId?: string): boolean {
  const rule = PERMITTED[action];
  if (rule.to === "anyone") return true;
  if (actor.type === "job") return rule.to === "journal" && (rule.jobs ?? []).includes(actor.job);
  if (actor.type === "anonymous") return false;
  if (rule.to === "signed-in") return true;
  if (!actor.isEmailVerified) return false;
  if (rule.to === "verified") return true;
  if (rule.to !== "journal") return rule.to === "administrator" && actor.isAdministrator;
  const grant = journalId === undefined ? undefined : findGrant(actor, journalId);
  if (!grant || !rule.roles.includes(grant.role)) return false;
  if (rule.isLicenceNeeded && !actor.isLicensed) return false;
  return grant.role === "person" || rule.scope === undefined || grant.scopes.includes(rule.scope);
}

/**
 * Refuse unless the actor may perform `action`.
 *
 * @throws {AppError} UNAUTHENTICATED when nobody is signed in; NOT_FOUND when
 *   the actor has no grant on the journal, so that a stranger cannot learn that
 *   it exists; FORBIDDEN when the role, scope or licence is too weak.
 */
export function authorize(actor: Actor, action: Action, journalId?: string): void {
  if (can(actor, action, journalId)) return;
  if (actor.type === "anonymous") throw new AppError("UNAUTHENTICATED", action);
  const isStranger = journalId !== undefined && actor.type === "user" && !findGrant(actor, journalId);
  if (isStranger) throw new AppError("NOT_FOUND", `${action} on journal ${journalId}`);
  throw new AppError("FORBIDDEN", `${action}${journalId ? ` on journal ${journalId}` : ""}`);
}

/** For acts that only a signed-in person can perform. @throws {AppError} UNAUTHENTICATED or FORBIDDEN */
export function requireUser(actor: Actor): Extract<Actor, { type: "user" }> {
  if (actor.type === "user") return actor;
  throw new AppError(actor.type === "anonymous" ? "UNAUTHENTICATED" : "FORBIDDEN", "a person is needed");
}
