import { describe, expect, it } from "vitest";
import { isCommonPassword } from "./common-password";

describe("isCommonPassword", () => {
  it.each(["passwordpassword", "Notchbook2026!!!", "aaaaaaaaaaaaaaaa", "abcabcabcabcabcabc", "1234567890123456", "abcdefghijklmnop", "insulin-insulin-1"])(
    "finds %s",
    (password) => expect(isCommonPassword(password)).toBe(true),
  );

  it.each(["correct horse battery staple", "three small birds sing", "Å-lang-setning-om-brød"])("lets %s pass", (password) =>
    expect(isCommonPassword(password)).toBe(false),
  );
});
