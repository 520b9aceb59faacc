import { dateText } from "./date-text";
import { educatorSection } from "./educator-section";
import { changesPart, dataPart, findingsPart, followUpLine, openPart, questionLines } from "./parts";
import type { Digest, DigestData, DigestSection, JournalWeek } from "./week";

const DAYS_IN_SPAN = 7;

/** One's own notebook, or one that was shared with a mentor or a family helper. */
function notebookSection(week: JournalWeek, data: DigestData, isOnly: boolean): DigestSection {
  const { level, unit, today } = data;
  const isOwn = week.role === "person";
  const followUps = week.followUps.map((one) => followUpLine(one, today));
  return {
    heading: isOwn ? (isOnly ? "Your notebook" : week.name) : `${week.ownerName}’s notebook`,
    parts: [
      ...changesPart(week, level, unit),
      ...findingsPart(week, level),
      ...(isOwn ? dataPart(week, data, DAYS_IN_SPAN) : []),
      ...openPart("Open questions", questionLines(week), level, "question waits for an answer", "questions wait for an answer"),
      ...(isOwn ? openPart("Follow-ups", followUps, level, "follow-up in the days to come", "follow-ups in the days to come") : []),
    ],
    path: `/j/${week.journalId}/changes`,
    pathLabel: "Open the notebook",
  };
}

function subjectOf(journals: ReadonlyArray<JournalWeek>): string {
  const [first, ...rest] = journals;
  const isOneOther = first !== undefined && rest.length === 0 && first.role !== "person";
  return isOneOther ? `A week in ${first.ownerName}’s notebook` : "Your week in Notchbook";
}

/**
 * A reader's week as sentences, from data that is already cut to what they may
 * see and chose to get by mail. The subject holds no health data; at "links"
 * nothing does but counts; values of settings and shares of readings stand only
 * at "full". Own notebooks come first, then those of others, then what an
 * educator looks after.
 *
 * @returns `null` when there is no notebook to tell of
 */
export function buildDigest(data: DigestData): Digest | null {
  if (data.journals.length === 0) return null;
  const own = data.journals.filter(({ role }) => role === "person");
  const others = data.journals.filter(({ role }) => role === "mentor" || role === "family");
  const reviewed = data.journals.filter(({ role }) => role === "educator");
  const sections = [
    ...own.map((week) => notebookSection(week, data, own.length === 1)),
    ...others.map((week) => notebookSection(week, data, false)),
    ...(reviewed.length > 0 ? [educatorSection(reviewed, data)] : []),
  ];
  const subject = subjectOf(data.journals);
  return {
    subject,
    heading: subject,
    preview: `${dateText(data.from)} to ${dateText(data.to)}`,
    sections,
  };
}
