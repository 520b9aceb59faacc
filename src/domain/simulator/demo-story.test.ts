import { describe, expect, it } from "vitest";
import { findSettingNumber } from "@/domain/access/setting-number";
import { entryDataSchema } from "@/domain/journal/entry";
import { expectationSchema } from "@/domain/settings/expectation";
import { settingsProfileSchema } from "@/domain/settings/profile";
import { profileDifference } from "@/domain/settings/difference";
import { startingProfile } from "@/domain/settings/starting-profile";
import { startingProfileRequestSchema } from "@/domain/settings/starting-profile-request";
import { DEMO_EFFECTIVE, DEMO_MISSED_DOSE_DAY, DEMO_PRESSURE } from "./demo-calendar";
import { demoStory } from "./demo-story";

const story = demoStory();
const isBefore = (a: { day: number; minute: number }, b: { day: number; minute: number }) => a.day - b.day || a.minute - b.minute;

/** Words the product never uses (content.md 8); what the demo's people write keeps to them too. */
const NEVER = /\b(best|worst|wrong|failed|good|bad|control|controlled|compliant|cheat|safe|should|increase|reduce|take|give|try|recommended)\b|!/i;

describe("demoStory", () => {
  it("is told the same way every time", () => expect(demoStory()).toEqual(story));

  it("has a row every five minutes from the start to the end of day 32", () => {
    expect(story.rows[0]).toMatchObject(DEMO_EFFECTIVE.version1);
    expect(story.rows.at(-1)).toMatchObject({ day: 32, minute: 1435 });
    expect(story.rows).toHaveLength(32 * 288 - 78);
    for (const { glucoseMgDl, basalMilliUnits, bolusMilliUnits } of story.rows) {
      expect([glucoseMgDl, basalMilliUnits, bolusMilliUnits].every(Number.isInteger)).toBe(true);
      expect(glucoseMgDl).toBeGreaterThanOrEqual(40);
      expect(glucoseMgDl).toBeLessThanOrEqual(400);
    }
  });

  it("starts from the profile that the published arithmetic gives", () => {
    const { ageYears, weightKg, injectionsTotalDailyDoseUnits } = story.background;
    const gate = Object.fromEntries(["pregnant", "under18", "recentSevereLow", "recentKetoacidosis", "impairedAwareness", "kidneyLiverAdrenal", "steroids", "acuteIllness", "eatingDisorder", "sglt2Inhibitor", "firstEverPump", "frailOrCognitive"].map((question) => [question, false]));
    const answer = startingProfile(startingProfileRequestSchema.parse({ ageYears, weightKg, injectionsTotalDailyDoseUnits, hypoProne: false, gate }));
    const start = story.versions[0]!.profile;
    expect(answer.profile?.cautious.basal).toEqual([{ startMinute: 0, unitsPerHour: start.basal[0]!.milliUnitsPerHour / 1000 }]);
    expect(answer.profile?.cautious.carbRatio).toEqual([{ startMinute: 0, gramsPerUnit: start.carbRatio[0]!.milligramsPerUnit / 1000 }]);
    expect(answer.profile?.cautious.sensitivity).toEqual([{ startMinute: 0, mgDlPerUnit: start.sensitivity[0]!.microMgDlPerUnit / 1e6 }]);
    expect(answer.profile?.cautious.target).toEqual(start.target);
    expect(answer.profile?.cautious.durationOfActionMinutes).toBe(start.durationOfActionMinutes);
  });

  it("holds versions that the product could have stored", () => {
    for (const { profile, expectation } of story.versions) {
      expect(settingsProfileSchema.parse(profile)).toEqual(profile);
      if (expectation) expect(expectationSchema.parse(expectation)).toEqual(expectation);
    }
    expect(story.versions.map(({ number, revision, state }) => `${number}.${revision} ${state}`)).toEqual([
      "1.1 superseded", "2.1 superseded", "3.1 returned", "3.2 superseded", "4.1 superseded", "5.1 in-effect", "6.1 proposed",
    ]);
  });

  it("changes one setting at a time but in the proposal that came back, and undoes by going back to version 3", () => {
    const profileOf = (number: number) => story.versions.findLast((version) => version.number === number)!.profile;
    const families = story.versions.slice(1).map(({ parentNumber, profile }) => profileDifference(profileOf(parentNumber!), profile).families);
    expect(families).toEqual([["carbRatio"], ["basal", "carbRatio"], ["basal"], ["sensitivity"], ["sensitivity"], ["carbRatio"]]);
    expect(profileOf(5)).toEqual(profileOf(3));
  });

  it("writes, decides and puts into force in that order, on evidence from before", () => {
    for (const { createdAt, review, effectiveFrom, evidenceDays } of story.versions) {
      if (review) expect(isBefore(createdAt, review.at)).toBeLessThan(0);
      if (effectiveFrom) expect(isBefore(review?.at ?? createdAt, effectiveFrom)).toBeLessThan(0);
      for (const day of evidenceDays) expect(day).toBeLessThan(createdAt.day);
    }
  });

  it("holds entries that the product could have stored, in order of time", () => {
    for (const { data } of story.entries) expect(entryDataSchema.parse(data)).toEqual(data);
    expect(story.entries).toEqual(story.entries.toSorted(isBefore));
    const days = (kind: string) => new Set(story.entries.filter(({ data }) => data.kind === kind).map(({ day }) => day)).size;
    expect(days("meal")).toBe(32);
    expect(days("feeling")).toBeGreaterThan(25);
    expect(days("note")).toBeGreaterThan(15);
  });

  it("forgets one dose, that of one dinner", () => {
    const missed = story.entries.filter(({ data }) => data.kind === "dose" && data.timing === "missed");
    expect(missed).toHaveLength(1);
    expect(missed[0]!.day).toBe(DEMO_MISSED_DOSE_DAY);
    expect(missed[0]!.minute).toBeGreaterThan(16 * 60);
  });

  it("logs each bolus the pump delivered, and no other", () => {
    const logged = story.entries.flatMap(({ day, minute, data }) => (data.kind === "dose" && data.milliUnits > 0 ? [`${day} ${minute} ${data.milliUnits}`] : []));
    const delivered = story.rows.filter(({ bolusMilliUnits }) => bolusMilliUnits > 0).map(({ day, minute, bolusMilliUnits }) => `${day} ${minute} ${bolusMilliUnits}`);
    expect(logged).toEqual(delivered);
  });

  it("reads far too low for an hour of one night", () => {
    const night = story.rows.filter(({ day, minute }) => day === DEMO_PRESSURE.day && minute < 360);
    const lows = night.filter(({ glucoseMgDl }) => glucoseMgDl < 70).map(({ minute }) => minute);
    expect(lows).toHaveLength((DEMO_PRESSURE.toMinute - DEMO_PRESSURE.fromMinute) / 5);
    expect(lows.every((minute) => minute >= DEMO_PRESSURE.fromMinute && minute < DEMO_PRESSURE.toMinute)).toBe(true);
  });

  it("is low on the three afternoons that its person counts", () => {
    for (const day of [20, 21, 22]) {
      expect(story.rows.some((row) => row.day === day && row.minute >= 720 && row.minute < 1080 && row.glucoseMgDl < 70), `day ${day}`).toBe(true);
    }
  });

  it("leaves the mentor without a number for a setting, and one question open on version 5", () => {
    for (const { author, body } of story.comments) if (author === "mentor") expect(findSettingNumber(body)).toBeNull();
    const answered = new Set(story.comments.map(({ inReplyTo }) => inReplyTo));
    const open = story.comments.filter(({ kind, key }) => kind === "question" && !answered.has(key));
    expect(open.map(({ subject, subjectNumber }) => `${subject} ${subjectNumber}`)).toEqual(["version 5"]);
    for (const { inReplyTo } of story.comments) if (inReplyTo) expect(story.comments.map(({ key }) => key)).toContain(inReplyTo);
  });

  it("is written in the words of the product", () => {
    const texts = [
      ...story.comments.map(({ body }) => body),
      ...story.flags.map(({ note }) => note),
      ...story.versions.flatMap(({ reason, revertRule, review }) => [reason.text, revertRule, review?.remarks ?? ""]),
      ...story.entries.flatMap(({ data }) => (data.kind === "note" ? [data.text] : data.kind === "meal" ? [data.label] : [])),
    ];
    for (const text of texts) expect(text).not.toMatch(NEVER);
  });
});
