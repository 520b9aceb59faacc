import type { JournalRole } from "@/domain/access/policy";
import type { GlucoseUnit } from "@/domain/units";
import type { DigestLevel } from "./basis";
import type { VersionNews } from "./version-news";

/** Shares of readings over some days, and how much of those days readings cover. All fractions 0 to 1. */
export type GlucoseShares = Readonly<{ days: number; inRangeFraction: number; belowFraction: number; coveredFraction: number }>;

export type FollowUp = Readonly<{ on: string; kind: "review" | "look"; versionNumber: number }>;

/**
 * One journal over the span of a digest, already cut to what this reader may
 * see: what is not shared is null or empty.
 */
export type JournalWeek = Readonly<{
  journalId: string;
  name: string;
  ownerName: string;
  role: JournalRole;
  /** The day from which changes are told when that is the reader's own last look; null for the span of the digest. */
  lookedOn: string | null;
  versions: ReadonlyArray<VersionNews> | null;
  findings: ReadonlyArray<Readonly<{ versionNumber: number; text: string }>>;
  /** Days of the span with at least one reading; with at least one entry. */
  glucoseDays: number | null;
  loggedDays: number | null;
  /** Over the span; over the 14 days up to its end. */
  week: GlucoseShares | null;
  fortnight: GlucoseShares | null;
  /** Open questions by others. */
  questions: ReadonlyArray<Readonly<{ askedBy: string; about: string }>>;
  /** Proposals that wait for a decision, longest first. */
  waiting: ReadonlyArray<Readonly<{ versionNumber: number; since: string }>>;
  /** Due within the week to come, or overdue. */
  followUps: ReadonlyArray<FollowUp>;
}>;

export type DigestData = Readonly<{
  level: Exclude<DigestLevel, "off">;
  /** The reader's own. */
  unit: GlucoseUnit;
  /** The seven civil days it is about, as ISO dates. */
  from: string;
  to: string;
  /** The civil day on which it is written. */
  today: string;
  journals: ReadonlyArray<JournalWeek>;
}>;

export type DigestPart = Readonly<{ title: string; lines: ReadonlyArray<string> }>;

/** One notebook, or all that an educator looks after, with the page that holds the rest. */
export type DigestSection = Readonly<{ heading: string; parts: ReadonlyArray<DigestPart>; path: string; pathLabel: string }>;

export type Digest = Readonly<{ subject: string; heading: string; preview: string; sections: ReadonlyArray<DigestSection> }>;

/**
 * The sentences about what followed a version, from the comparison engine;
 * null when there is nothing to say. Lent to the digest by whoever starts it.
 */
export type FindingOf = (journalId: string, versionNumber: number) => Promise<string | null>;
