import { eq } from "drizzle-orm";
import { beforeAll, describe, expect, it } from "vitest";
import type { Pool } from "@/db/client";
import { insertAccount } from "@/db/repositories/accounts";
import { listLiveGrants } from "@/db/repositories/grants";
import { invitations, journalEvents } from "@/db/schema/journals";
import { outbox } from "@/db/schema/mail";
import { users } from "@/db/schema/people";
import { mailConsent } from "@/lib/mail-consent";
import { deliverDueMail } from "@/lib/mailer";
import { anonymousContext, contextFor, createHelper, createJournal, createPerson, strangerContext, TEST_NOW } from "@/testing/factories";
import { createTestDb } from "@/testing/test-database";
import { circle } from "../queries/circle";
import { invitationByLink, waitingInvitations } from "../queries/invitation";
import type { InviteHelperInput } from "../schema";
import { acceptInvitation } from "./accept-invitation";
import { inviteHelper } from "./invite-helper";
import { withdrawInvitation } from "./withdraw-invitation";

const DAY_MS = 86_400_000;
const later = (days: number) => new Date(TEST_NOW.getTime() + days * DAY_MS);

describe("invitations", () => {
  let db: Pool;
  let count = 0;
  beforeAll(async () => {
    db = await createTestDb();
  });

  const form = (journalId: string, given: Partial<InviteHelperInput> = {}): InviteHelperInput => ({
    journalId, email: `helper-${(count += 1)}@example.org`, role: "mentor", scopes: ["settings", "glucose"], until: "", ...given,
  });
  const tokenOf = async (email: string) => {
    const mails = await db.select().from(outbox).where(eq(outbox.toAddress, email));
    return /invitation\?token=([A-Za-z0-9_-]{43})/.exec(mails.at(-1)?.text ?? "")?.[1] ?? "";
  };
  const invite = async (given: Partial<InviteHelperInput> = {}) => {
    const journal = await createJournal(db);
    const input = form(journal.journalId, given);
    const { invitationId } = await inviteHelper(await contextFor(db, journal.ownerId), input);
    const email = input.email.toLowerCase();
    return { ...journal, invitationId, email, token: await tokenOf(email) };
  };

  describe("inviteHelper", () => {
    it("keeps the link's hash only, writes one mail that says nothing of health, and one event without the address", async () => {
      const { journalId, email, token } = await invite({ email: "New.Mentor@Example.org", until: "2026-06-30" });
      const [row] = await db.select().from(invitations).where(eq(invitations.journalId, journalId));
      expect(row).toMatchObject({ email: "new.mentor@example.org", role: "mentor", scopes: ["settings", "glucose"], expiresAt: later(14), grantExpiresAt: new Date("2026-06-30T22:00:00Z") });
      expect(JSON.stringify(row)).not.toContain(token);
      const [mail] = await db.select().from(outbox).where(eq(outbox.toAddress, email));
      expect(mail).toMatchObject({ kind: "invitation", journalId, recipientId: null });
      const events = await db.select().from(journalEvents).where(eq(journalEvents.journalId, journalId));
      expect(events).toMatchObject([{ action: "circle.manage", details: { step: "invited" } }]);
      expect(JSON.stringify(events)).not.toContain("new.mentor");
    });

    it("takes an earlier invitation to the same address back", async () => {
      const first = await invite();
      await inviteHelper(await contextFor(db, first.ownerId), form(first.journalId, { email: first.email, role: "educator" }));
      expect(await invitationByLink(anonymousContext(db), { token: first.token })).toBeNull();
      expect((await circle(await contextFor(db, first.ownerId), first)).invitations).toMatchObject([{ role: "educator" }]);
    });

    it.each([
      ["email", { email: "nobody" }],
      ["role", { role: "person" as "mentor" }],
      ["until", { until: "30.6.2026" }],
    ])("names %s as amiss, and writes nothing", async (field, given) => {
      const { journalId, ownerId } = await createJournal(db);
      await expect(inviteHelper(await contextFor(db, ownerId), form(journalId, given))).rejects.toMatchObject({ issues: [expect.objectContaining({ path: [field] })] });
      expect(await db.select().from(invitations).where(eq(invitations.journalId, journalId))).toEqual([]);
    });

    it("refuses a last day that is over, the own address, and somebody who is in the circle", async () => {
      const { journalId, ownerId } = await createJournal(db, { ownerId: await createPerson(db, { email: "own@example.org" }) });
      await createHelper(db, { journalId, ownerId, role: "mentor" });
      const ctx = await contextFor(db, ownerId);
      await expect(inviteHelper(ctx, form(journalId, { until: "2026-03-09" }))).rejects.toMatchObject({ fields: { until: [expect.any(String)] } });
      await expect(inviteHelper(ctx, form(journalId, { email: "own@example.org" }))).rejects.toMatchObject({ fields: { email: ["This is your own address."] } });
      expect(await db.select().from(invitations).where(eq(invitations.journalId, journalId))).toEqual([]);
    });

    it("is for the person alone", async () => {
      const journal = await createJournal(db);
      for (const role of ["mentor", "educator", "family"] as const) {
        const ctx = await contextFor(db, await createHelper(db, { ...journal, role }));
        await expect(inviteHelper(ctx, form(journal.journalId))).rejects.toMatchObject({ code: "FORBIDDEN" });
        await expect(circle(ctx, journal)).rejects.toMatchObject({ code: "FORBIDDEN" });
      }
      await expect(inviteHelper(await strangerContext(db), form(journal.journalId))).rejects.toMatchObject({ code: "NOT_FOUND" });
      await expect(inviteHelper(anonymousContext(db), form(journal.journalId))).rejects.toMatchObject({ code: "UNAUTHENTICATED" });
    });

    it("is limited in number", async () => {
      const { journalId, ownerId } = await createJournal(db);
      const ctx = await contextFor(db, ownerId);
      for (let i = 0; i < 30; i += 1) await inviteHelper(ctx, form(journalId));
      await expect(inviteHelper(ctx, form(journalId))).rejects.toMatchObject({ code: "TOO_MANY" });
    });
  });

  describe("acceptInvitation", () => {
    it("lets a new account in by the link, once, with exactly what was shared", async () => {
      const { journalId, email, token } = await invite({ until: "2026-06-30", scopes: ["settings"] });
      const userId = await createPerson(db, { email });
      expect(await acceptInvitation(await contextFor(db, userId), { token })).toEqual({ journalId });
      expect(await listLiveGrants(db, userId, TEST_NOW)).toEqual([{ journalId, role: "mentor", scopes: ["settings"] }]);
      expect(await listLiveGrants(db, userId, new Date("2026-06-30T22:00:00Z"))).toEqual([]);
      await expect(acceptInvitation(await contextFor(db, userId), { token })).rejects.toMatchObject({ code: "NOT_FOUND" });
    });

    it("has one winner among many presses", async () => {
      const { journalId, email, token } = await invite();
      const ctx = await contextFor(db, await createPerson(db, { email }));
      const all = await Promise.allSettled(Array.from({ length: 10 }, () => acceptInvitation(ctx, { token })));
      expect(all.filter(({ status }) => status === "fulfilled")).toHaveLength(1);
      expect(await db.select().from(journalEvents).where(eq(journalEvents.journalId, journalId))).toHaveLength(2);
    });

    it("lets in without the link whoever has the verified address", async () => {
      const { journalId, invitationId, email } = await invite();
      const ctx = await contextFor(db, await createPerson(db, { email }));
      expect(await waitingInvitations(ctx)).toMatchObject([{ journalId, id: invitationId }]);
      await acceptInvitation(ctx, { journalId, invitationId });
      expect(await waitingInvitations(ctx)).toEqual([]);
    });

    it("refuses another address, and an address that is not verified, and leaves the invitation open", async () => {
      const { journalId, invitationId, email, token } = await invite();
      const other = await createPerson(db);
      await expect(acceptInvitation(await contextFor(db, other), { token })).rejects.toMatchObject({ code: "FORBIDDEN" });
      await expect(acceptInvitation(await contextFor(db, other), { journalId, invitationId })).rejects.toMatchObject({ code: "NOT_FOUND" });
      const unverified = await createPerson(db, { email, isVerified: false });
      await expect(acceptInvitation(await contextFor(db, unverified), { token })).rejects.toMatchObject({ code: "FORBIDDEN" });
      await expect(acceptInvitation(anonymousContext(db), { token })).rejects.toMatchObject({ code: "UNAUTHENTICATED" });
      expect(await invitationByLink(await contextFor(db, other), { token })).toMatchObject({ standing: "other-address", invitation: { email } });
      expect(await invitationByLink(await contextFor(db, unverified), { token })).toMatchObject({ standing: "unverified" });
      expect(await invitationByLink(anonymousContext(db), { token })).toMatchObject({ standing: "signed-out" });
      expect(await listLiveGrants(db, other, TEST_NOW)).toEqual([]);
    });

    it("is over after 14 days, and after it was taken back", async () => {
      const { journalId, ownerId, invitationId, email, token } = await invite();
      const userId = await createPerson(db, { email });
      await expect(acceptInvitation(await contextFor(db, userId, later(14)), { token })).rejects.toMatchObject({ code: "NOT_FOUND" });
      await withdrawInvitation(await contextFor(db, ownerId), { journalId, invitationId });
      await expect(acceptInvitation(await contextFor(db, userId), { token })).rejects.toMatchObject({ code: "NOT_FOUND" });
      expect(await listLiveGrants(db, userId, TEST_NOW)).toEqual([]);
    });

    it("never replaces the person's own grant", async () => {
      const { journalId, ownerId } = await createJournal(db, { ownerId: await createPerson(db, { email: "first@example.org" }) });
      const email = "changed@example.org";
      await inviteHelper(await contextFor(db, ownerId), form(journalId, { email }));
      const token = await tokenOf(email);
      await db.update(users).set({ email }).where(eq(users.id, ownerId));
      await expect(acceptInvitation(await contextFor(db, ownerId), { token })).rejects.toMatchObject({ code: "CONFLICT" });
      expect(await listLiveGrants(db, ownerId, TEST_NOW)).toMatchObject([{ role: "person" }]);
    });

    it.each([{ token: "short" }, { token: "" }, {} as { token: string }])("refuses %j as no link", async (input) => {
      await expect(acceptInvitation(anonymousContext(db), input)).rejects.toMatchObject({ name: "ZodError" });
    });
  });

  describe("withdrawInvitation", () => {
    it("is for the person alone, and for an open one", async () => {
      const { journalId, ownerId, invitationId } = await invite();
      const mentor = await createHelper(db, { journalId, ownerId, role: "mentor" });
      await expect(withdrawInvitation(await contextFor(db, mentor), { journalId, invitationId })).rejects.toMatchObject({ code: "FORBIDDEN" });
      await expect(withdrawInvitation(await strangerContext(db), { journalId, invitationId })).rejects.toMatchObject({ code: "NOT_FOUND" });
      const other = await createJournal(db);
      await expect(withdrawInvitation(await contextFor(db, other.ownerId), { journalId: other.journalId, invitationId })).rejects.toMatchObject({ code: "NOT_FOUND" });
      const ctx = await contextFor(db, ownerId);
      await withdrawInvitation(ctx, { journalId, invitationId });
      await expect(withdrawInvitation(ctx, { journalId, invitationId })).rejects.toMatchObject({ code: "NOT_FOUND" });
    });

    it("keeps a mail back that has not left yet", async () => {
      const { journalId, ownerId, invitationId, email } = await invite();
      await withdrawInvitation(await contextFor(db, ownerId), { journalId, invitationId });
      await deliverDueMail(db, () => TEST_NOW, () => Promise.resolve({ providerId: "p" }), mailConsent(db, () => TEST_NOW));
      expect(await db.select().from(outbox).where(eq(outbox.toAddress, email))).toMatchObject([{ state: "dropped" }]);
    });
  });

  it("shows an address with or without an account alike", async () => {
    const { journalId, ownerId } = await createJournal(db);
    const email = "has.account@example.org";
    await insertAccount(db, { email, displayName: "X", passwordHash: "x", timeZone: "UTC", glucoseUnit: "mg/dL", createdAt: TEST_NOW });
    const ctx = await contextFor(db, ownerId);
    await inviteHelper(ctx, form(journalId, { email }));
    await inviteHelper(ctx, form(journalId, { email: "no.account@example.org" }));
    const { invitations: open } = await circle(ctx, { journalId });
    expect(open.map(({ role, sentOn, expiresOn }) => ({ role, sentOn, expiresOn }))).toEqual(Array(2).fill({ role: "mentor", sentOn: "2026-03-10", expiresOn: "2026-03-24" }));
  });
});
