import type { VersionState } from "@/domain/journal/version-lifecycle";
import { changeText } from "@/domain/settings/difference-text";
import { FAMILY_FACTS } from "@/domain/settings/family";
import type { GlucoseUnit } from "@/domain/units";
import type { DigestLevel } from "./basis";
import { dateText } from "./date-text";
import type { VersionNews } from "./version-news";

const CHANGES_AT_MOST = 6;

function nameOf({ number, kind, families }: VersionNews): string {
  if (kind === "starting") return `Version ${number}, the starting profile,`;
  const labels = families.map((family) => FAMILY_FACTS[family].label).join(", ");
  const inWords = kind === "undo" ? ["back to earlier settings", labels].filter(Boolean).join(": ") : labels;
  return inWords ? `Version ${number} (${inWords})` : `Version ${number}`;
}

function happened({ state, on, until }: VersionNews): string {
  const day = dateText(on);
  const SAID: Record<VersionState, string> = {
    draft: `was begun on ${day}`,
    proposed: `waits for an educator since ${day}`,
    returned: `came back with remarks on ${day}`,
    declined: `was declined on ${day}`,
    approved: `was approved on ${day} and is not in effect yet`,
    "in-effect": `went into effect on ${day}`,
    superseded: until === null || until === on ? `was in effect on ${day}` : `was in effect from ${day} to ${dateText(until)}`,
    withdrawn: `was withdrawn on ${day}`,
  };
  return SAID[state];
}

/**
 * One version's news as a sentence. Old and new values stand in it only at the
 * level "full".
 *
 * @returns for example "Version 3 (basal rate) went into effect on Monday 9 March."
 */
export function versionLine(news: VersionNews, level: DigestLevel, unit: GlucoseUnit): string {
  const sentence = `${nameOf(news)} ${happened(news)}`;
  if (level !== "full" || news.changes.length === 0) return `${sentence}.`;
  const told = news.changes.slice(0, CHANGES_AT_MOST).map((change) => changeText(change, unit)).join("; ");
  const rest = news.changes.length - CHANGES_AT_MOST;
  return `${sentence}: ${told}${rest > 0 ? `; and ${rest} more` : ""}.`;
}
