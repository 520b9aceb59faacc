import { beforeAll, describe, expect, it } from "vitest";
import type { Pool } from "@/db/client";
import { findTokenOwner } from "@/db/repositories/api-tokens";
import { apiTokens } from "@/db/schema/operations";
import { hashSecret } from "@/lib/secrets";
import { anonymousContext, contextFor, createPerson, strangerContext, TEST_NOW } from "@/testing/factories";
import { createTestDb } from "@/testing/test-database";
import { TOKEN_DAYS, TOKENS_AT_MOST } from "../constants";
import { ownTokens } from "../queries/tokens";
import { createToken } from "./create-token";
import { revokeToken } from "./revoke-token";

const asked = { label: "my script", scope: "read" };

describe("personal tokens", () => {
  let db: Pool;
  beforeAll(async () => {
    db = await createTestDb();
  });
  const ownerOf = (secret: string, at = TEST_NOW) => findTokenOwner(db, hashSecret(secret), at);

  it("says the secret once and keeps only its hash", async () => {
    const userId = await createPerson(db);
    const { secret } = await createToken(await contextFor(db, userId), asked);
    expect(await ownerOf(secret)).toEqual({ userId, scope: "read" });
    expect(JSON.stringify(await db.select().from(apiTokens))).not.toContain(secret);
    expect(await ownTokens(await contextFor(db, userId))).toMatchObject([{ ...asked, lastUsedAt: TEST_NOW }]);
  });

  it("ends after its days", async () => {
    const userId = await createPerson(db);
    const { secret } = await createToken(await contextFor(db, userId), { ...asked, scope: "write" });
    const lastMoment = TEST_NOW.getTime() + TOKEN_DAYS * 86_400_000 - 1;
    expect(await ownerOf(secret, new Date(lastMoment))).toEqual({ userId, scope: "write" });
    expect(await ownerOf(secret, new Date(lastMoment + 1))).toBeUndefined();
    expect(await ownTokens(await contextFor(db, userId, new Date(lastMoment + 1)))).toEqual([]);
  });

  it("is ended by its owner at once, and by nobody else", async () => {
    const userId = await createPerson(db);
    const ctx = await contextFor(db, userId);
    const { secret } = await createToken(ctx, asked);
    const [token] = await ownTokens(ctx);
    const tokenId = token?.id ?? "";
    await expect(revokeToken(await strangerContext(db), { tokenId })).rejects.toMatchObject({ code: "NOT_FOUND" });
    expect(await ownerOf(secret)).toBeDefined();
    await revokeToken(ctx, { tokenId });
    expect([await ownerOf(secret), await ownTokens(ctx)]).toEqual([undefined, []]);
    await expect(revokeToken(ctx, { tokenId })).rejects.toMatchObject({ code: "NOT_FOUND" });
  });

  it("is made by verified accounts only, as many as allowed", async () => {
    const unverified = await contextFor(db, await createPerson(db, { isVerified: false }));
    await expect(createToken(unverified, asked)).rejects.toMatchObject({ code: "FORBIDDEN" });
    await expect(createToken(anonymousContext(db), asked)).rejects.toMatchObject({ code: "UNAUTHENTICATED" });
    const ctx = await contextFor(db, await createPerson(db));
    for (let i = 0; i < TOKENS_AT_MOST; i += 1) await createToken(ctx, asked);
    await expect(createToken(ctx, asked)).rejects.toMatchObject({ code: "INVALID_INPUT", fields: { label: [expect.any(String)] } });
    expect(await ownTokens(ctx)).toHaveLength(TOKENS_AT_MOST);
  });

  it.each([["label", { label: " " }], ["scope", { scope: "own" }]])("refuses one whose %s is amiss", async (field, wrong) => {
    const ctx = await strangerContext(db);
    await expect(createToken(ctx, { ...asked, ...wrong })).rejects.toMatchObject({ issues: [expect.objectContaining({ path: [field] })] });
    expect(await ownTokens(ctx)).toEqual([]);
  });
});
