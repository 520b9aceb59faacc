import type { CommentSubject } from "@/domain/access/comment-subject";
import type { DemoMoment } from "./demo-calendar";
import type { DemoRole } from "./demo-people";

/** One comment or question of the demo. `subjectNumber` is a version, or a day of the story where the subject is a day. */
export type DemoComment = Readonly<{
  key: string; subject: CommentSubject; subjectNumber: number; kind: "comment" | "question";
  author: DemoRole; at: DemoMoment; body: string; inReplyTo: string | null;
}>;

/**
 * What was said in the demo. The mentor asks and tells, and names no number for a
 * setting; one of the questions on version 5 still waits for an answer.
 */
export const DEMO_CONVERSATION: ReadonlyArray<DemoComment> = [
  {
    key: "two-breakfast", subject: "version", subjectNumber: 2, kind: "question", author: "mentor", at: { day: 6, minute: 1245 },
    body: "What did you expect before you looked, and how many mornings will you wait before you look again?", inReplyTo: null,
  },
  {
    key: "two-answer", subject: "version", subjectNumber: 2, kind: "comment", author: "person", at: { day: 6, minute: 1290 },
    body: "A flatter morning by the second tray. I will leave it alone until day 10.", inReplyTo: "two-breakfast",
  },
  {
    key: "three-night", subject: "version", subjectNumber: 3, kind: "comment", author: "mentor", at: { day: 13, minute: 1180 },
    body: "I looked at the nights before and after. Mine took me a month to see as clearly. Did you sleep through them, or were you up?", inReplyTo: null,
  },
  {
    key: "three-answer", subject: "version", subjectNumber: 3, kind: "comment", author: "person", at: { day: 14, minute: 1150 },
    body: "Slept, apart from market morning. Marguerite asked me to look once at three, and it was level.", inReplyTo: "three-night",
  },
  {
    key: "fever-day", subject: "day", subjectNumber: 15, kind: "comment", author: "educator", at: { day: 15, minute: 585 },
    body: "Thank you for the message. Follow the sick-day plan, look at ketones every few hours, and ring if you cannot keep fluids down.", inReplyTo: null,
  },
  {
    key: "five-undo", subject: "version", subjectNumber: 5, kind: "comment", author: "mentor", at: { day: 24, minute: 1110 },
    body: "You wrote your own rule and kept to it. I have gone back more often than forward in my first year.", inReplyTo: null,
  },
  {
    key: "five-open", subject: "version", subjectNumber: 5, kind: "question", author: "mentor", at: { day: 30, minute: 1200 },
    body: "Were those afternoons like any other at the bakery, or was something different on those three days?", inReplyTo: null,
  },
];
