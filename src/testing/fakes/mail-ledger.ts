import { createHash, randomUUID } from "node:crypto";
import { appendFileSync, existsSync, mkdirSync, readFileSync } from "node:fs";
import { dirname } from "node:path";
import { z } from "zod";

const letterSchema = z.object({
  from: z.string().min(1),
  to: z.union([z.string().min(1), z.array(z.string().min(1)).min(1).max(50)]).transform((to) => [to].flat()),
  subject: z.string().min(1).refine((subject) => !/[\r\n]/.test(subject), "a subject has no line breaks"),
  html: z.string().default(""),
  text: z.string().default(""),
  headers: z.record(z.string(), z.string()).default({}),
});

const mailSchema = letterSchema.extend({
  id: z.string(),
  receivedAt: z.string(),
  key: z.string().nullable(),
  bodyHash: z.string(),
});
export type KeptMail = z.infer<typeof mailSchema>;

/** How long the provider remembers an Idempotency-Key. */
const KEY_LIVES_MS = 24 * 3_600_000;
const KEPT_AT_MOST = 1000;

export type Taken =
  | Readonly<{ kind: "taken" | "known"; id: string }>
  | Readonly<{ kind: "other-body" }>
  | Readonly<{ kind: "invalid"; message: string }>;

/** What the fake received, in memory and line by line in a file, so that a restart forgets nothing. */
export class MailLedger {
  private readonly kept: KeptMail[] = [];

  constructor(private readonly file: string | null) {
    if (!file || !existsSync(file)) return;
    const lines = readFileSync(file, "utf8").split("\n").filter(Boolean).slice(-KEPT_AT_MOST);
    for (const line of lines) {
      const mail = mailSchema.safeParse(parsed(line));
      if (mail.success) this.kept.push(mail.data);
    }
  }

  /** Take a letter, or say that this key has brought it already, or brought another. */
  take(body: string, key: string | null, now: Date): Taken {
    const bodyHash = createHash("sha256").update(body).digest("hex");
    const before = key === null ? undefined : this.kept.find((mail) => mail.key === key && now.getTime() - Date.parse(mail.receivedAt) < KEY_LIVES_MS);
    if (before) return before.bodyHash === bodyHash ? { kind: "known", id: before.id } : { kind: "other-body" };
    const letter = letterSchema.safeParse(parsed(body));
    if (!letter.success) return { kind: "invalid", message: z.prettifyError(letter.error) };
    const mail: KeptMail = { ...letter.data, id: randomUUID(), receivedAt: now.toISOString(), key, bodyHash };
    this.kept.push(mail);
    if (this.file) {
      mkdirSync(dirname(this.file), { recursive: true });
      appendFileSync(this.file, `${JSON.stringify(mail)}\n`, { mode: 0o600 });
    }
    return { kind: "taken", id: mail.id };
  }

  /** Newest first, of one recipient if asked. */
  list(to: string | null = null): KeptMail[] {
    return this.kept.filter((mail) => to === null || mail.to.includes(to)).toReversed();
  }

  find(id: string): KeptMail | undefined {
    return this.kept.find((mail) => mail.id === id);
  }
}

function parsed(text: string): unknown {
  try {
    return JSON.parse(text);
  } catch {
    return undefined;
  }
}
