import { z } from "zod";
import { COMMENT_SUBJECTS } from "@/domain/access/comment-subject";
import { SCOPES } from "@/domain/access/permissions";
import { listOf } from "@/domain/form-text";
import { COMMENT_CHARACTERS_AT_MOST, HELPER_ROLES } from "./constants";

const email = z
  .string({ error: "Type an e-mail address." })
  .trim()
  .toLowerCase()
  .max(254, "An e-mail address has at most 254 characters.")
  .pipe(z.email("Type an e-mail address, such as name@example.org."));

/** The last day on which a helper may look; empty for no end. */
const until = z
  .union([z.literal("").transform(() => null), z.undefined().transform(() => null), z.null(), z.iso.date("Type a date, such as 2026-12-31.")]);

const journalId = z.uuid();
const scopes = listOf(SCOPES);

export const inviteHelperInput = z.object({ journalId, email, role: z.enum(HELPER_ROLES, { error: "Choose a role." }), scopes, until });
export type InviteHelperInput = z.input<typeof inviteHelperInput>;

export const withdrawInvitationInput = z.object({ journalId, invitationId: z.uuid() });
export const limitHelperInput = z.object({ journalId, userId: z.uuid(), scopes, until });
export type LimitHelperInput = z.input<typeof limitHelperInput>;
export const removeHelperInput = z.object({ journalId, userId: z.uuid() });

/** By the link of the mail, or among those that wait for a verified address. */
export const acceptInvitationInput = z.union([
  z.object({ token: z.string().regex(/^[A-Za-z0-9_-]{43}$/) }),
  z.object({ journalId, invitationId: z.uuid() }),
]);
export type AcceptInvitationInput = z.input<typeof acceptInvitationInput>;

const VERSION_KEY = /^[1-9]\d{0,5}$/;

/** A version number, or for a day its ISO date. */
const place = z
  .object({ subject: z.enum(COMMENT_SUBJECTS), subjectKey: z.string().max(20) })
  .refine(({ subject, subjectKey }) => (subject === "day" ? z.iso.date().safeParse(subjectKey).success : VERSION_KEY.test(subjectKey)), {
    path: ["subjectKey"],
    message: "This is not something to comment on.",
  });

export const threadInput = z.intersection(z.object({ journalId }), place);
export type ThreadInput = z.input<typeof threadInput>;

const CONTROL_SIGNS = /[\u0000-\u0008\u000b-\u001f\u007f]/g;

const body = z
  .string({ error: "Type a comment or a question." })
  .transform((text) => text.replace(/\r\n?/g, "\n").replace(CONTROL_SIGNS, "").trim())
  .pipe(
    z
      .string()
      .min(1, "Type a comment or a question.")
      .max(COMMENT_CHARACTERS_AT_MOST, `A comment has at most ${COMMENT_CHARACTERS_AT_MOST} characters.`),
  );

/** What the form in the browser checks; the place comes along as hidden fields. */
export const commentFormInput = z.object({ body });

export const addCommentInput = z.intersection(
  z.object({
    journalId,
    kind: z.enum(["comment", "question"]).default("comment"),
    body,
    inReplyTo: z.union([z.literal("").transform(() => undefined), z.uuid()]).optional(),
  }),
  place,
);
export type AddCommentInput = z.input<typeof addCommentInput>;

export const markCommentsReadInput = z.object({ journalId, readUpTo: z.iso.datetime() });
