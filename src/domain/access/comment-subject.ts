import { can, type Action, type Actor } from "./policy";

/** What a comment or question can be about. */
export const COMMENT_SUBJECTS = ["version", "day", "comparison"] as const;
export type CommentSubject = (typeof COMMENT_SUBJECTS)[number];

/** Whoever may not see a thing may not read what is said about it either. */
export const READ_ACTION_OF_SUBJECT = {
  version: "version.read",
  day: "entry.read",
  comparison: "comparison.read",
} as const satisfies Record<CommentSubject, Action>;

/** The kinds of subject whose comments an actor may read in one journal. */
export function readableSubjects(actor: Actor, journalId: string): CommentSubject[] {
  if (!can(actor, "comment.read", journalId)) return [];
  return COMMENT_SUBJECTS.filter((subject) => can(actor, READ_ACTION_OF_SUBJECT[subject], journalId));
}
