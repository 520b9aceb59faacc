import { openPool } from "@/db/client";
import { findAccountByEmail } from "@/db/repositories/accounts";
import { insertToken } from "@/db/repositories/api-tokens";
import { env } from "@/env";
import { TOKEN_DAYS } from "@/features/account/constants";
import { hashSecret, newSecret } from "@/lib/secrets";

/** `npm run token -- E-MAIL [read|write]`: a personal token for the HTTP interface, shown once. */
async function makeToken(email: string, scope: string): Promise<void> {
  if (scope !== "read" && scope !== "write") throw new Error("the scope is read or write");
  const db = openPool(env.databaseUrl, 1);
  try {
    const account = await findAccountByEmail(db, email);
    if (!account) throw new Error(`no account has the address ${email}`);
    const secret = newSecret();
    const createdAt = new Date();
    await insertToken(db, { userId: account.id, tokenHash: hashSecret(secret), label: "made on the server", scope, createdAt, expiresAt: new Date(createdAt.getTime() + TOKEN_DAYS * 86_400_000) });
    process.stdout.write(`${secret}\n`);
  } finally {
    await db.$client.end();
  }
}

const [email = "", scope = "read"] = process.argv.slice(2);
await makeToken(email, scope).catch((error: unknown) => {
  process.stderr.write(`token: ${error instanceof Error ? error.message : String(error)}\n`);
  process.exitCode = 1;
});
