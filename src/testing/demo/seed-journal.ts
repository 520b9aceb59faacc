import { eq, and } from "drizzle-orm";
import type { Pool } from "@/db/client";
import { insertComment } from "@/db/repositories/comments";
import { insertDayFlag, insertEntry } from "@/db/repositories/entries";
import { upsertFallbackCard } from "@/db/repositories/fallback-cards";
import { upsertGrant } from "@/db/repositories/grants";
import { appendEvent } from "@/db/repositories/journal-events";
import { insertJournal } from "@/db/repositories/journals";
import { insertReview } from "@/db/repositories/version-reviews";
import { insertVersion } from "@/db/repositories/versions";
import { insertDraft } from "@/db/repositories/wizard-drafts";
import { versionStates } from "@/db/schema/settings";
import { SCOPES } from "@/domain/access/permissions";
import { addDays, dayNumberOf } from "@/domain/day-start";
import { DEMO_BACKGROUND, type DemoRole } from "@/domain/simulator/demo-people";
import type { DemoStory } from "@/domain/simulator/demo-story";
import type { DemoVersion } from "@/domain/simulator/demo-versions";
import { startingProfile } from "@/domain/settings/starting-profile";
import { GATE_QUESTIONS } from "@/domain/settings/gate-questions";
import { startingProfileRequestSchema } from "@/domain/settings/starting-profile-request";
import { hashProfile } from "@/lib/content-hash";
import type { DemoClock } from "./demo-clock";

type People = Record<DemoRole, string>;

/** The demo's journal with its circle, versions, decisions, comments, flags and entries. @returns its id */
export async function seedJournal(db: Pool, story: DemoStory, people: People, at: DemoClock, dayOne: string): Promise<string> {
  const createdAt = at({ day: -6, minute: 640 });
  const journalId = await insertJournal(db, {
    ownerId: people.person, name: "Ilka’s notebook", timeZone: story.timeZone, glucoseUnit: "mg/dL", plannedStartOn: dayOne, startedOn: dayOne,
    therapy: "injections", gateReasons: [], createdAt,
    setup: { pump: "a patch pump", sensor: "a five-minute sensor", controller: "a loop on the phone", insulin: "rapid analogue", basalStepMilliUnits: DEMO_BACKGROUND.basalStepMilliUnits, bolusStepMilliUnits: DEMO_BACKGROUND.bolusStepMilliUnits },
  });
  await upsertGrant(db, { journalId, userId: people.person, role: "person", scopes: [...SCOPES], grantedAt: createdAt, grantedBy: people.person, expiresAt: null });
  for (const role of ["mentor", "educator", "family"] as const) {
    await upsertGrant(db, { journalId, userId: people[role], role, scopes: [...SCOPES], grantedAt: at({ day: -5, minute: 700 }), grantedBy: people.person, expiresAt: null });
  }
  await insertDraft(db, { journalId, updatedAt: createdAt, updatedBy: people.person });
  await upsertFallbackCard(db, {
    journalId, previousSetup: "Long-acting 20 U at 22:00.\nRapid: 1 U for 12 g, by the table on the fridge.\nCorrection: by the same table.",
    longActingMilliUnits: DEMO_BACKGROUND.longActingMilliUnits, emergencyNumber: "113",
    contacts: [{ name: "Signe", phone: "+47 00 00 00 01" }, { name: "Diabetes line", phone: "+47 00 00 00 02" }], updatedAt: createdAt,
  });
  for (const version of story.versions) await seedVersion(db, journalId, version, story, people, at, dayOne);
  const ids = new Map<string, string>();
  for (const comment of story.comments) {
    const id = await insertComment(db, {
      journalId, subject: comment.subject, subjectKey: String(comment.subjectNumber), kind: comment.kind, body: comment.body,
      authorId: people[comment.author], createdAt: at(comment.at), inReplyTo: comment.inReplyTo ? (ids.get(comment.inReplyTo) ?? null) : null,
    });
    ids.set(comment.key, id);
  }
  for (const flag of story.flags) {
    await insertDayFlag(db, {
      journalId, code: flag.code, firstDay: dayNumberOf(addDays(dayOne, flag.firstDay - 1)), lastDay: dayNumberOf(addDays(dayOne, flag.lastDay - 1)),
      strength: flag.strength, note: flag.note, isGraphSeen: flag.isGraphSeen, setBy: people.person, setAt: at(flag.setAt),
    });
  }
  const now = new Date();
  for (const entry of story.entries) {
    const moment = at(entry);
    if (moment > now) continue;
    await insertEntry(db, { journalId, kind: entry.data.kind, at: moment, data: entry.data, createdBy: people.person, createdAt: moment, updatedAt: moment });
  }
  return journalId;
}

async function seedVersion(db: Pool, journalId: string, version: DemoVersion, story: DemoStory, people: People, at: DemoClock, dayOne: string): Promise<void> {
  const isoDay = (day: number) => addDays(dayOne, day - 1);
  const { number, revision, review } = version;
  const contentHash = hashProfile(version.profile);
  await insertVersion(
    db,
    {
      journalId, number, revision, parentNumber: version.parentNumber, kind: version.kind, profile: version.profile, contentHash,
      reasonCode: version.reason.code, reasonText: version.reason.text, expectation: version.expectation, evidenceDays: version.evidenceDays.map(isoDay),
      lookAgainOn: version.lookAgainDay === null ? null : isoDay(version.lookAgainDay), revertRule: version.revertRule, guardrails: [],
      arithmetic: version.kind === "starting" ? arithmetic() : null, authorId: people[version.author], createdAt: at(version.createdAt),
    },
    version.state,
  );
  const next = story.versions.find((v) => v.number === number + 1 && v.effectiveFrom);
  const isApproved = review?.decision === "approved";
  await db
    .update(versionStates)
    .set({
      effectiveFrom: version.effectiveFrom ? at(version.effectiveFrom) : null,
      effectiveUntil: version.state === "superseded" && next?.effectiveFrom ? at(next.effectiveFrom) : null,
      approvedHash: isApproved ? contentHash : null,
      reviewOn: isApproved && review.reviewOnDay !== null ? isoDay(review.reviewOnDay) : null,
    })
    .where(and(eq(versionStates.journalId, journalId), eq(versionStates.number, number)));
  if (review) {
    await insertReview(db, {
      journalId, number, revision, decision: review.decision, reviewerId: people[review.by], contentHash, reasonCode: review.reason, remarks: review.remarks,
      signOffText: isApproved ? `I have reviewed version ${number} (hash ${contentHash.slice(0, 12)}) and the checklist. In my professional judgement and within my scope of practice these settings are suitable to begin.` : "",
      reviewOn: isApproved && review.reviewOnDay !== null ? isoDay(review.reviewOnDay) : null, at: at(review.at),
    });
  }
  await appendEvent(db, { journalId, at: at(version.createdAt), actorId: people[version.author], actorKind: "user", action: "version.propose", subject: `version ${number}`, requestId: "demo" });
}

function arithmetic() {
  const gate = Object.fromEntries(Object.keys(GATE_QUESTIONS).map((q) => [q, false]));
  return startingProfile(startingProfileRequestSchema.parse({ ...DEMO_BACKGROUND, hypoProne: false, gate }));
}
