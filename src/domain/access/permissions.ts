/** A role within one journal. */
export type JournalRole = "person" | "mentor" | "educator" | "family";

/** What a helper is shown; the person chooses each. */
export type Scope = "settings" | "glucose" | "entries" | "notes" | "feelings" | "photos";

export const SCOPES = ["settings", "glucose", "entries", "notes", "feelings", "photos"] as const satisfies ReadonlyArray<Scope>;

type JobName = "weekly-digest" | "outbox";

type Rule =
  | { to: "anyone" | "signed-in" | "verified" | "administrator" }
  | {
      to: "journal";
      roles: ReadonlyArray<JournalRole>;
      /** What the person must have shared; not asked of the person. */
      scope?: Scope;
      isLicenceNeeded?: boolean;
      jobs?: ReadonlyArray<JobName>;
    };

const PERSON = ["person"] as const;
const EDUCATOR = ["educator"] as const;
const CIRCLE = ["person", "mentor", "educator", "family"] as const;
const DIGEST = ["weekly-digest"] as const;

/** Who may do what. The whole table, in one place; anything absent is refused. */
const TABLE = {
  "account.enter": { to: "anyone" },
  "account.use": { to: "signed-in" },
  "token.manage": { to: "verified" },
  "invitation.accept": { to: "verified" },
  "journal.list": { to: "verified" },
  "journal.create": { to: "verified" },
  "review.list": { to: "verified" },
  "administration.read": { to: "administrator" },
  "credential.submit": { to: "verified" },
  "credential.verify": { to: "administrator" },

  "digest.choose": { to: "verified" },
  "mailbox.read": { to: "anyone" },

  "digest.send": { to: "journal", roles: [], jobs: DIGEST },
  "journal.read": { to: "journal", roles: CIRCLE, jobs: DIGEST },
  "journal.edit": { to: "journal", roles: PERSON },
  "draft.read": { to: "journal", roles: PERSON },
  "draft.save": { to: "journal", roles: PERSON },

  "version.read": { to: "journal", roles: CIRCLE, scope: "settings", jobs: DIGEST },
  "version.propose": { to: "journal", roles: PERSON },
  "version.record": { to: "journal", roles: PERSON },
  "version.withdraw": { to: "journal", roles: PERSON },
  "version.effect": { to: "journal", roles: PERSON },
  "version.review": { to: "journal", roles: EDUCATOR, scope: "settings", isLicenceNeeded: true },

  "glucose.read": { to: "journal", roles: CIRCLE, scope: "glucose", jobs: DIGEST },
  "glucose.import": { to: "journal", roles: PERSON },
  "comparison.read": { to: "journal", roles: CIRCLE, scope: "glucose", jobs: DIGEST },

  "entry.read": { to: "journal", roles: CIRCLE, scope: "entries", jobs: DIGEST },
  "entry.log": { to: "journal", roles: ["person", "family"], scope: "entries" },
  "flag.set": { to: "journal", roles: ["person", "family"], scope: "entries" },

  "comment.read": { to: "journal", roles: CIRCLE, jobs: DIGEST },
  "comment.write": { to: "journal", roles: CIRCLE },

  "circle.read": { to: "journal", roles: PERSON },
  "circle.manage": { to: "journal", roles: PERSON },
  "circle.leave": { to: "journal", roles: ["mentor", "educator", "family"] },
  "access-log.read": { to: "journal", roles: PERSON },

  "fallback.read": { to: "journal", roles: CIRCLE, scope: "settings" },
  "fallback.write": { to: "journal", roles: PERSON },
  "fallback.dose": { to: "journal", roles: EDUCATOR, scope: "settings", isLicenceNeeded: true },
} as const satisfies Record<string, Rule>;

export type Action = keyof typeof TABLE;

export const PERMITTED: Readonly<Record<Action, Rule>> = TABLE;
