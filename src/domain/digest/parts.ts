import { thresholdText } from "@/domain/glucose-text";
import type { GlucoseUnit } from "@/domain/units";
import { dateText } from "./date-text";
import { versionLine } from "./version-line";
import type { DigestData, DigestPart, FollowUp, GlucoseShares, JournalWeek } from "./week";

type Level = DigestData["level"];

/** Readings have to cover this share of the days before a figure is said (metrics.md, consensus of 70 %). */
export const COVERED_FRACTION_AT_LEAST = 0.7;

const QUIET = "No changes this week. That is a good way to learn something.";

/** "1 change", "2 changes". */
export function counted(count: number, one: string, many: string): string {
  return `${count} ${count === 1 ? one : many}`;
}

const percent = (fraction: number, decimals: number) => `${(fraction * 100).toFixed(decimals)}%`;

/** Up to the first full stop that ends a sentence; "70 (3.9)" does not. */
export function firstSentence(text: string): string {
  return /^.*?[.?](?=\s|$)/s.exec(text)?.[0] ?? text;
}

export function changesPart(week: JournalWeek, level: Level, unit: GlucoseUnit): DigestPart[] {
  if (week.versions === null) return [];
  const title = week.role === "person" ? "What changed" : week.lookedOn ? "What changed since you looked" : "What changed";
  const since = week.lookedOn ? [`You looked last on ${dateText(week.lookedOn)}.`] : [];
  if (week.versions.length === 0) {
    return [{ title, lines: week.lookedOn ? [...since, "Nothing has changed since."] : [QUIET] }];
  }
  const count = [`${counted(week.versions.length, "change or proposal", "changes and proposals")}.`];
  const told = level === "links" ? count : week.versions.map((version) => versionLine(version, level, unit));
  return [{ title, lines: [...since, ...told] }];
}

export function findingsPart(week: JournalWeek, level: Level): DigestPart[] {
  if (level === "links" || week.findings.length === 0) return [];
  return [{ title: "What followed", lines: week.findings.map(({ text }) => (level === "full" ? text : firstSentence(text))) }];
}

function sharesLine({ days, inRangeFraction, belowFraction, coveredFraction }: GlucoseShares, unit: GlucoseUnit): string {
  if (coveredFraction < COVERED_FRACTION_AT_LEAST) {
    return `Readings cover ${percent(coveredFraction, 0)} of these ${days} days, too little to say figures.`;
  }
  const low = thresholdText(70, unit);
  return `In these ${days} days ${percent(inRangeFraction, 0)} of readings were in range, ${low} to ${thresholdText(180, unit)} ${unit}, and ${percent(belowFraction, 1)} below ${low}.`;
}

export function dataPart(week: JournalWeek, { level, unit }: DigestData, daysInSpan: number): DigestPart[] {
  const glucose = week.glucoseDays === null ? [] : [`Glucose on ${week.glucoseDays} of ${daysInSpan} days.`];
  const logged = week.loggedDays === null ? [] : [`Something logged on ${week.loggedDays} of ${daysInSpan} days.`];
  const shares = level === "full" && week.week ? [sharesLine(week.week, unit)] : [];
  const lines = [...glucose, ...logged, ...shares];
  return lines.length > 0 ? [{ title: "Days with data", lines }] : [];
}

/** @param name whose notebook, where the part is about several; otherwise empty */
export function questionLines(week: JournalWeek, name = ""): string[] {
  return week.questions.map(({ askedBy, about }) => `${name}${askedBy} asks about ${about}.`);
}

export function followUpLine(followUp: FollowUp, today: string, name?: string): string {
  const what = followUp.kind === "review" ? `next review of version ${followUp.versionNumber}` : `a look at version ${followUp.versionNumber}, as planned`;
  const isOverdue = followUp.on < today;
  const when = isOverdue ? `${name ? "due" : "Due"} since ${dateText(followUp.on)}` : dateText(followUp.on);
  return `${name ? `${name}, ` : ""}${when}: ${what}.`;
}

/** Open questions and follow-ups: counts at "links", lines at the other levels. */
export function openPart(title: string, lines: ReadonlyArray<string>, level: Level, one: string, many: string): DigestPart[] {
  if (lines.length === 0) return [];
  return [{ title, lines: level === "links" ? [`${counted(lines.length, one, many)}.`] : lines }];
}
