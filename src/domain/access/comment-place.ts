import { dateText } from "@/domain/digest/date-text";
import type { CommentSubject } from "./comment-subject";

/** What a comment is about, in words: "version 5", "Monday 9 March", "the comparison of version 5". */
export function subjectText(subject: CommentSubject, subjectKey: string): string {
  if (subject === "day") return dateText(subjectKey);
  return subject === "version" ? `version ${subjectKey}` : `the comparison of version ${subjectKey}`;
}

/** The page on which its comments stand. */
export function subjectPath(journalId: string, subject: CommentSubject, subjectKey: string): string {
  const room = { version: "changes", day: "days", comparison: "compare" }[subject];
  return `/j/${journalId}/${room}/${subjectKey}#comments`;
}
