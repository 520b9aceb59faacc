import { z } from "zod";
import { isCommonPassword } from "@/domain/access/common-password";
import { tick } from "@/domain/form-text";
import { isZone } from "@/domain/zone-name";
import { PASSWORD_CHARACTERS_AT_LEAST, PASSWORD_CHARACTERS_AT_MOST } from "./constants";

const email = z
  .string({ error: "Type your e-mail address." })
  .trim()
  .toLowerCase()
  .max(254, "An e-mail address has at most 254 characters.")
  .pipe(z.email("Type an e-mail address, such as name@example.org."));

const newPassword = z
  .string({ error: "Type a password." })
  .min(PASSWORD_CHARACTERS_AT_LEAST, `A password has at least ${PASSWORD_CHARACTERS_AT_LEAST} characters. A few words work well.`)
  .max(PASSWORD_CHARACTERS_AT_MOST, `A password has at most ${PASSWORD_CHARACTERS_AT_MOST} characters.`)
  .refine((value) => !isCommonPassword(value), "Many people use this password. Choose one of your own.");

const displayName = z
  .string({ error: "Type the name that others see." })
  .trim()
  .min(1, "Type the name that others see.")
  .max(80, "A name has at most 80 characters.")
  .refine((value) => !/[\p{Cc}\p{Cf}]/u.test(value), "A name is letters, spaces and signs only.");

export const zoneField = z.string({ error: "Choose a time zone." }).refine(isZone, "Choose a time zone from the list.");

export const signUpInput = z.object({
  displayName,
  email,
  password: newPassword,
  timeZone: zoneField,
  isAdultOrHelper: tick.refine((value) => value, "Say that you have read this."),
});
export type SignUpInput = z.input<typeof signUpInput>;

export const signInInput = z.object({
  email,
  password: z.string({ error: "Type your password." }).min(1, "Type your password.").max(1000, "This is longer than any password here."),
  next: z.string().max(500).optional(),
});
export type SignInInput = z.input<typeof signInInput>;

const token = z.string().regex(/^[A-Za-z0-9_-]{43}$/, "This link is not complete. Open it from the mail again.");

export const verifyEmailInput = z.object({ token });
export const requestResetInput = z.object({ email });
export const resetPasswordInput = z.object({ token, password: newPassword });

export const updateAccountInput = z.object({ displayName, timeZone: zoneField, glucoseUnit: z.enum(["mg/dL", "mmol/L"]) });

export const changePasswordInput = z.object({
  currentPassword: z.string({ error: "Type your present password." }).min(1, "Type your present password.").max(1000),
  password: newPassword,
});

export const endSessionInput = z.object({ sessionId: z.string().regex(/^[0-9a-f]{64}$/) });

export const createTokenInput = z.object({
  label: z.string({ error: "Name what this token is for." }).trim().min(1, "Name what this token is for.").max(80, "A name has at most 80 characters."),
  scope: z.enum(["read", "write"], "Choose what this token may do."),
});
export const revokeTokenInput = z.object({ tokenId: z.uuid() });

export const demoRoleInput = z.object({ role: z.enum(["person", "mentor", "educator", "family", "administrator"]) });

/** For a button that carries nothing. */
export const nothingInput = z.object({});

const line = (what: string) => z.string({ error: what }).trim().min(1, what).max(120, "At most 120 characters.");

export const submitCredentialInput = z.object({
  profession: line("Type your profession."),
  licenceNumber: line("Type the number of your licence."),
  jurisdiction: line("Type where the licence holds."),
  expiresOn: z.iso.date("Type the date it runs out."),
});
