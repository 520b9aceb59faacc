import { hash, verify } from "@node-rs/argon2";

/** argon2id, 19 MiB, two passes, one lane: OWASP's second listed setting. */
const PARAMETERS = { memoryCost: 19_456, timeCost: 2, parallelism: 1 };

/** At most this many at a time: a flood of sign-ins must not eat the machine. */
const AT_ONCE = 3;
let running = 0;
const waiting: (() => void)[] = [];

async function inTurn<T>(work: () => Promise<T>): Promise<T> {
  if (running >= AT_ONCE) await new Promise<void>((go) => waiting.push(go));
  running += 1;
  try {
    return await work();
  } finally {
    running -= 1;
    waiting.shift()?.();
  }
}

/** Unicode spellings of one password count as one (NFKC). */
export async function hashPassword(password: string): Promise<string> {
  return inTurn(() => hash(password.normalize("NFKC"), PARAMETERS));
}

export async function isPasswordRight(passwordHash: string, password: string): Promise<boolean> {
  return inTurn(() => verify(passwordHash, password.normalize("NFKC")));
}

let decoy: Promise<string> | undefined;

/** The same work as a real check, for an address without an account, so that time tells nothing. */
export async function spendPasswordCheck(password: string): Promise<void> {
  decoy ??= hashPassword("no account has this password");
  await isPasswordRight(await decoy, password);
}
