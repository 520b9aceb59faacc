import { thresholdText } from "@/domain/glucose-text";
import { dateText } from "./date-text";
import { COVERED_FRACTION_AT_LEAST, followUpLine, openPart, questionLines } from "./parts";
import type { DigestData, DigestPart, DigestSection, JournalWeek } from "./week";

/** The usual aim is less than this share of readings below 70 mg/dL (content.md 8, consensus of 4 %). */
const BELOW_FRACTION_AIM = 0.04;

/**
 * Lows are said by name at "summary", with their figure at "full", and not at
 * all at "links", which holds no health data. Too little data is said as that.
 */
function lowsPart(journals: ReadonlyArray<JournalWeek>, { level, unit }: DigestData): DigestPart[] {
  if (level === "links") return [];
  const lines = journals.flatMap(({ ownerName, fortnight }) => {
    if (fortnight === null) return [];
    const { days, belowFraction, coveredFraction } = fortnight;
    if (coveredFraction < COVERED_FRACTION_AT_LEAST) return [`${ownerName}: too little data in ${days} days to say.`];
    if (belowFraction <= BELOW_FRACTION_AIM) return [];
    if (level === "summary") return [`${ownerName}: above the usual aim over ${days} days.`];
    return [`${ownerName}: ${(belowFraction * 100).toFixed(1)}% of ${days} days was below ${thresholdText(70, unit)}. The usual aim is under 4%.`];
  });
  return lines.length > 0 ? [{ title: "Lows", lines }] : [];
}

/** What waits for an educator, over all the people they look after: proposals, lows, follow-ups, questions. */
export function educatorSection(journals: ReadonlyArray<JournalWeek>, data: DigestData): DigestSection {
  const { level, today } = data;
  const named = (line: (week: JournalWeek, name: string) => string[]) => journals.flatMap((week) => line(week, `${week.ownerName}: `));
  const waiting = named(({ waiting: all }, name) => all.map(({ versionNumber, since }) => `${name}version ${versionNumber} waits since ${dateText(since)}.`));
  const followUps = journals.flatMap(({ followUps: all, ownerName }) => all.map((one) => followUpLine(one, today, ownerName)));
  const proposals: DigestPart[] = waiting.length > 0
    ? openPart("Proposals", waiting, level, "proposal waits for you", "proposals wait for you")
    : [{ title: "Proposals", lines: ["No proposal waits for you."] }];
  return {
    heading: "People you review for",
    parts: [
      ...proposals,
      ...lowsPart(journals, data),
      ...openPart("Follow-ups", followUps, level, "follow-up is due this week", "follow-ups are due this week"),
      ...openPart("Open questions", named(questionLines), level, "question waits for an answer", "questions wait for an answer"),
    ],
    path: "/review",
    pathLabel: "Open the review list",
  };
}
