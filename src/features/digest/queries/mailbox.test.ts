import { describe, expect, it } from "vitest";
import { anonymousContext } from "@/testing/factories";
import { createTestDb } from "@/testing/test-database";
import { mailbox } from "./mailbox";

describe("mailbox", () => {
  it("is not there outside a local demo", async () => {
    await expect(mailbox(anonymousContext(await createTestDb()))).rejects.toMatchObject({ code: "NOT_FOUND" });
  });
});
