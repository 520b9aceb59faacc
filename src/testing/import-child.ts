import { openPool } from "@/db/client";
import { findActor } from "@/lib/actor";
import { runImport } from "@/features/glucose/use-cases/run-import";

/** One import in a process of its own, so that a test can kill it: APP_DATABASE_URL, then user, journal, import. */
const [userId = "", journalId = "", importId = ""] = process.argv.slice(2);
const db = openPool(process.env.APP_DATABASE_URL ?? "", 3);
const now = () => new Date();
process.send?.("started");
await runImport(
  { actor: await findActor(db, userId, now()), db, now, requestId: "import-child" },
  {
    journalId, importId, encoding: "utf-8", delimiter: ",", headerRow: 0, timeColumn: 0, dateColumn: null, glucoseColumn: 1, subjectColumn: null, subject: null,
    dateOrder: "day-first", unit: "mg/dL", timeZone: "UTC", shiftMinutes: 0,
  },
);
await db.$client.end();
