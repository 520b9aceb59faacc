import { eq } from "drizzle-orm";
import { beforeAll, describe, expect, it } from "vitest";
import type { Pool } from "@/db/client";
import { saveDigestPreference } from "@/db/repositories/digest-preferences";
import { comments } from "@/db/schema/circle";
import { accessLog, journalEvents } from "@/db/schema/journals";
import { outbox } from "@/db/schema/mail";
import { DEFAULT_DIGEST_PREFERENCE } from "@/domain/digest/preference";
import { anonymousContext, contextFor, createHelper, createJournal, strangerContext, TEST_NOW } from "@/testing/factories";
import { createTestDb } from "@/testing/test-database";
import { createVersion } from "@/testing/version-factory";
import { NUMBER_SENTENCE } from "../constants";
import { latestComments, listComments } from "../queries/comments";
import { unreadComments } from "../queries/unread-comments";
import type { AddCommentInput } from "../schema";
import { addComment } from "./add-comment";
import { markCommentsRead } from "./mark-comments-read";

describe("comments", () => {
  let db: Pool;
  beforeAll(async () => {
    db = await createTestDb();
  });

  const journalWithVersion = async () => {
    const journal = await createJournal(db);
    await createVersion(db, { journalId: journal.journalId, authorId: journal.ownerId, number: 1 });
    return journal;
  };
  const at = (minute: number) => new Date(TEST_NOW.getTime() + minute * 60_000);
  const say = (journalId: string, given: Partial<AddCommentInput> = {}): AddCommentInput => ({
    journalId, subject: "version", subjectKey: "1", kind: "comment", body: "What did you expect before you looked?", ...given,
  });
  const mailsTo = (userId: string) => db.select().from(outbox).where(eq(outbox.recipientId, userId));

  it("are kept with one event, and told to the others without their words", async () => {
    const journal = await journalWithVersion();
    const { journalId, ownerId } = journal;
    const mentorId = await createHelper(db, { ...journal, role: "mentor" });
    const blindId = await createHelper(db, { ...journal, role: "family", scopes: ["entries"] });
    const deafId = await createHelper(db, { ...journal, role: "family" });
    await saveDigestPreference(db, deafId, { ...DEFAULT_DIGEST_PREFERENCE, isToldOfComments: false }, TEST_NOW);
    await addComment(await contextFor(db, mentorId), say(journalId, { kind: "question" }));
    expect(await db.select().from(journalEvents).where(eq(journalEvents.journalId, journalId))).toMatchObject([{ action: "comment.write", subject: "version 1" }]);
    const [mail, ...more] = await mailsTo(ownerId);
    expect(more).toEqual([]);
    expect(mail).toMatchObject({ kind: "new-comment", journalId, subject: "A mentor asks something in Notchbook" });
    expect(mail?.text).toContain(`/j/${journalId}/changes/1#comments`);
    for (const part of [mail?.text, mail?.html, mail?.subject]) expect(part).not.toContain("expect before");
    for (const userId of [mentorId, blindId, deafId]) expect(await mailsTo(userId)).toEqual([]);
  });

  it("make one mail a day until they are marked as read", async () => {
    const journal = await journalWithVersion();
    const { journalId, ownerId } = journal;
    const mentor = await contextFor(db, await createHelper(db, { ...journal, role: "mentor" }));
    for (let i = 0; i < 3; i += 1) await addComment({ ...mentor, now: () => at(i) }, say(journalId));
    expect(await mailsTo(ownerId)).toHaveLength(1);
    await markCommentsRead(await contextFor(db, ownerId, at(5)), { journalId, readUpTo: at(2).toISOString() });
    await addComment({ ...mentor, now: () => at(6) }, say(journalId));
    expect(await mailsTo(ownerId)).toHaveLength(2);
    await addComment({ ...mentor, now: () => at(24 * 60) }, say(journalId));
    expect(await mailsTo(ownerId)).toHaveLength(3);
  });

  it("of a mentor hold no number for a setting, unless asked as a question", async () => {
    const journal = await journalWithVersion();
    const mentor = await contextFor(db, await createHelper(db, { ...journal, role: "mentor" }));
    const body = "I had 0.55 U/h at night.";
    await expect(addComment(mentor, say(journal.journalId, { body }))).rejects.toMatchObject({ code: "INVALID_INPUT", fields: { body: [NUMBER_SENTENCE] } });
    expect(await db.select().from(comments).where(eq(comments.journalId, journal.journalId))).toEqual([]);
    await addComment(mentor, say(journal.journalId, { body, kind: "question" }));
    for (const role of ["educator", "family"] as const) {
      await addComment(await contextFor(db, await createHelper(db, { ...journal, role })), say(journal.journalId, { body }));
    }
    await addComment(await contextFor(db, journal.ownerId), say(journal.journalId, { body }));
    expect(await db.select().from(comments).where(eq(comments.journalId, journal.journalId))).toHaveLength(4);
  });

  it.each([
    ["body", { body: "  \u0000 " }],
    ["body", { body: "x".repeat(4001) }],
    ["subjectKey", { subjectKey: "0" }],
    ["subjectKey", { subject: "day" as const, subjectKey: "2026-02-30" }],
    ["subject", { subject: "person" as "day" }],
    ["inReplyTo", { inReplyTo: "none" }],
  ])("whose %s is amiss are refused, and nothing is written", async (field, given) => {
    const { journalId, ownerId } = await journalWithVersion();
    await expect(addComment(await contextFor(db, ownerId), say(journalId, given))).rejects.toMatchObject({ issues: [{ path: [field] }] });
    expect(await db.select().from(comments).where(eq(comments.journalId, journalId))).toEqual([]);
  });

  it("on a version that is not there, or in answer to something elsewhere, leave nothing behind", async () => {
    const { journalId, ownerId } = await journalWithVersion();
    const other = await journalWithVersion();
    const elsewhere = await addComment(await contextFor(db, other.ownerId), say(other.journalId));
    const ctx = await contextFor(db, ownerId);
    await expect(addComment(ctx, say(journalId, { subjectKey: "9" }))).rejects.toMatchObject({ code: "NOT_FOUND" });
    await expect(addComment(ctx, say(journalId, { inReplyTo: elsewhere.commentId }))).rejects.toMatchObject({ code: "NOT_FOUND" });
    expect(await db.select().from(journalEvents).where(eq(journalEvents.journalId, journalId))).toEqual([]);
  });

  it("are closed to strangers, and to helpers with whom their subject is not shared", async () => {
    const journal = await journalWithVersion();
    const { journalId } = journal;
    const thread = { journalId, subject: "version" as const, subjectKey: "1" };
    for (const [ctx, code] of [[await strangerContext(db), "NOT_FOUND"], [anonymousContext(db), "UNAUTHENTICATED"]] as const) {
      await expect(addComment(ctx, say(journalId))).rejects.toMatchObject({ code });
      await expect(listComments(ctx, thread)).rejects.toMatchObject({ code });
      await expect(latestComments(ctx, { journalId })).rejects.toMatchObject({ code });
      await expect(markCommentsRead(ctx, { journalId, readUpTo: TEST_NOW.toISOString() })).rejects.toMatchObject({ code });
    }
    await expect(unreadComments(anonymousContext(db))).rejects.toMatchObject({ code: "UNAUTHENTICATED" });
    const family = await contextFor(db, await createHelper(db, { ...journal, role: "family", scopes: ["entries"] }));
    await expect(addComment(family, say(journalId))).rejects.toMatchObject({ code: "FORBIDDEN" });
    await expect(listComments(family, thread)).rejects.toMatchObject({ code: "FORBIDDEN" });
    await addComment(await contextFor(db, journal.ownerId), say(journalId));
    await addComment(await contextFor(db, journal.ownerId), say(journalId, { subject: "day", subjectKey: "2026-03-09", body: "A long day." }));
    expect((await latestComments(family, { journalId })).map(({ body }) => body)).toEqual(["A long day."]);
    expect((await unreadComments(family)).get(journalId)).toBe(1);
  });

  it("are unread until marked, for each reader, and one's own never are", async () => {
    const journal = await journalWithVersion();
    const { journalId, ownerId } = journal;
    const mentorId = await createHelper(db, { ...journal, role: "mentor" });
    await addComment(await contextFor(db, mentorId, at(1)), say(journalId, { body: "First" }));
    await addComment(await contextFor(db, mentorId, at(2)), say(journalId, { body: "Second" }));
    const owner = await contextFor(db, ownerId, at(9));
    const unread = async () => (await unreadComments(owner)).get(journalId);
    expect(await unread()).toBe(2);
    expect((await unreadComments(await contextFor(db, mentorId, at(9)))).get(journalId)).toBe(0);
    await markCommentsRead(owner, { journalId, readUpTo: at(1).toISOString() });
    expect(await unread()).toBe(1);
    expect((await latestComments(owner, { journalId })).map(({ body, isUnread }) => [body, isUnread])).toEqual([["Second", true], ["First", false]]);
    await markCommentsRead(owner, { journalId, readUpTo: at(2).toISOString() });
    await markCommentsRead(owner, { journalId, readUpTo: at(1).toISOString() });
    expect(await unread()).toBe(0);
    await markCommentsRead(owner, { journalId, readUpTo: at(600).toISOString() });
    await addComment(await contextFor(db, mentorId, at(10)), say(journalId, { body: "Third" }));
    expect(await unread()).toBe(1);
  });

  it("stand in order with author and role, keep their text as it was typed, and a helper's look is noted", async () => {
    const journal = await journalWithVersion();
    const { journalId, ownerId } = journal;
    const mentorId = await createHelper(db, { ...journal, role: "mentor" });
    const evil = "<img src=x onerror=alert(1)>\n\"><svg onload=alert(1)>";
    const { commentId } = await addComment(await contextFor(db, ownerId, at(1)), say(journalId, { body: `${evil}\r\n`, kind: "question" }));
    await addComment(await contextFor(db, mentorId, at(2)), say(journalId, { body: "Was it at the same hour?", inReplyTo: commentId }));
    const thread = await listComments(await contextFor(db, mentorId, at(3)), { journalId, subject: "version", subjectKey: "1" });
    expect(thread).toMatchObject([
      { body: evil, kind: "question", isOpen: false, when: "Tuesday 10 March, 10:01", authorRole: "person", isOwn: false, isUnread: true },
      { body: "Was it at the same hour?", inReplyTo: commentId, authorName: "A mentor", authorRole: "mentor", isOwn: true, isUnread: false },
    ]);
    expect(await db.select().from(accessLog).where(eq(accessLog.journalId, journalId))).toMatchObject([{ userId: mentorId, what: "comments on version 1" }]);
  });

  it("that ask stay open until somebody else answers", async () => {
    const journal = await journalWithVersion();
    const { journalId, ownerId } = journal;
    const mentor = await contextFor(db, await createHelper(db, { ...journal, role: "mentor" }));
    const { commentId } = await addComment(mentor, say(journalId, { kind: "question" }));
    const isOpen = async () => (await latestComments(mentor, { journalId })).find(({ id }) => id === commentId)?.isOpen;
    await addComment(mentor, say(journalId, { body: "I mean the night.", inReplyTo: commentId }));
    expect(await isOpen()).toBe(true);
    await addComment(await contextFor(db, ownerId), say(journalId, { body: "Calmer mornings.", inReplyTo: commentId }));
    expect(await isOpen()).toBe(false);
  });
});
