/** NIST 800-63B: a password used alone has at least fifteen characters. */
export const PASSWORD_CHARACTERS_AT_LEAST = 15;
export const PASSWORD_CHARACTERS_AT_MOST = 256;

export const VERIFY_LINK_HOURS = 48;
export const RESET_LINK_MINUTES = 60;
