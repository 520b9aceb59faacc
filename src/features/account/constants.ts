/** NIST 800-63B: a password used alone has at least fifteen characters. */
export const PASSWORD_CHARACTERS_AT_LEAST = 15;
export const PASSWORD_CHARACTERS_AT_MOST = 256;

export const VERIFY_LINK_HOURS = 48;
export const RESET_LINK_MINUTES = 60;

export const TOKEN_DAYS = 90;
export const TOKENS_AT_MOST = 20;

/** The demo's invented accounts, by the role they show. */
export const DEMO_ADDRESSES = {
  person: "ilka@demo.example",
  mentor: "tobias@demo.example",
  educator: "marguerite@demo.example",
  family: "signe@demo.example",
  administrator: "dov@demo.example",
} as const;

export const DEMO_ROLE_WORDS = {
  person: "as the person",
  mentor: "as the mentor",
  educator: "as the educator",
  family: "as the family helper",
  administrator: "as the administrator",
} as const;
