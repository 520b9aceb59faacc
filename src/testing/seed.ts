import { mkdirSync, writeFileSync } from "node:fs";
import { randomBytes } from "node:crypto";
import { openPool, type Pool } from "@/db/client";
import { countAccounts, insertAccount } from "@/db/repositories/accounts";
import { upsertCredential } from "@/db/repositories/credentials";
import { DEMO_DAYS, DEMO_TIME_ZONE } from "@/domain/simulator/demo-calendar";
import { DEMO_PEOPLE, type DemoRole } from "@/domain/simulator/demo-people";
import { demoStory } from "@/domain/simulator/demo-story";
import { addDays } from "@/domain/day-start";
import { isoDayOf } from "@/domain/iso-day";
import { env } from "@/env";
import { hashPassword } from "@/lib/passwords";
import { demoClock } from "./demo/demo-clock";
import { seedDigests } from "./demo/seed-digests";
import { seedGlucose } from "./demo/seed-glucose";
import { seedJournal } from "./demo/seed-journal";

/** Fill an empty database with the invented demo; a database that has accounts is left alone. */
async function seed(db: Pool, now: Date): Promise<void> {
  if ((await countAccounts(db)).all > 0) return;
  const dayOne = addDays(isoDayOf(now, DEMO_TIME_ZONE), -(DEMO_DAYS - 1));
  const at = demoClock(dayOne, DEMO_TIME_ZONE);
  const people = await seedPeople(db, at({ day: -6, minute: 600 }));
  const story = demoStory();
  const journalId = await seedJournal(db, story, people, at, dayOne);
  await seedGlucose(db, story, { journalId, ownerId: people.person, dayOne, now }, at);
  await seedDigests(db, now);
  mkdirSync(".data", { recursive: true });
  writeFileSync(".data/demo.json", JSON.stringify(Object.entries(DEMO_PEOPLE).map(([role, { name }]) => ({ name, role })), null, 2));
}

/** Accounts that nobody can type a password for: the front page's one press is the way in. */
async function seedPeople(db: Pool, createdAt: Date): Promise<Record<DemoRole, string>> {
  const passwordHash = await hashPassword(randomBytes(32).toString("base64url"));
  const ids: Partial<Record<DemoRole, string>> = {};
  for (const role of Object.keys(DEMO_PEOPLE) as DemoRole[]) {
    const { name, email } = DEMO_PEOPLE[role];
    const id = await insertAccount(db, {
      email, displayName: name, passwordHash, timeZone: DEMO_TIME_ZONE, glucoseUnit: "mg/dL", createdAt, emailVerifiedAt: createdAt, isAdministrator: role === "administrator",
    });
    if (!id) throw new Error(`${email} is there already`);
    ids[role] = id;
  }
  const { educator, administrator } = ids;
  if (educator && administrator) {
    await upsertCredential(db, {
      userId: educator, profession: "Registered nurse, diabetes educator", licenceNumber: "INV-20417", jurisdiction: "Invented county",
      expiresOn: addDays(isoDayOf(createdAt, "UTC"), 700), submittedAt: createdAt, verifiedAt: createdAt, verifiedBy: administrator,
    });
  }
  return ids as Record<DemoRole, string>;
}

const db = openPool(env.ownerDatabaseUrl, 4);
await seed(db, new Date());
await db.$client.end();
