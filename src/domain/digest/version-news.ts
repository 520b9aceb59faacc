import type { VersionState } from "@/domain/journal/version-lifecycle";
import { profileDifference, type SettingChange } from "@/domain/settings/difference";
import type { SettingFamily } from "@/domain/settings/family";
import type { SettingsProfile } from "@/domain/settings/profile";
import { isoDayOf } from "@/domain/iso-day";

/** What has to be known of a version to tell its news. */
export type VersionFacts = Readonly<{
  number: number;
  kind: "starting" | "change" | "undo";
  parentNumber: number | null;
  profile: SettingsProfile;
  state: VersionState;
  stateSince: Date;
  effectiveFrom: Date | null;
  effectiveUntil: Date | null;
}>;

/** A version to which something happened in a span of time. Dates are civil dates in the reader's zone. */
export type VersionNews = Readonly<{
  number: number;
  kind: VersionFacts["kind"];
  state: VersionState;
  families: ReadonlyArray<SettingFamily>;
  changes: ReadonlyArray<SettingChange>;
  on: string;
  until: string | null;
}>;

/** States whose beginning is news by itself. That a version was superseded is told by the one after it. */
const TELLS: ReadonlySet<VersionState> = new Set(["proposed", "returned", "declined", "approved", "withdrawn"]);

/**
 * The versions that went into effect, or whose review moved, within a span;
 * oldest number first, each with what differs from the version it came from.
 *
 * @param versions every version of one journal, in any order
 * @param span     from included, until not
 * @param zone     the reader's IANA zone
 */
export function versionNews(versions: ReadonlyArray<VersionFacts>, span: Readonly<{ from: Date; until: Date }>, zone: string): VersionNews[] {
  const isWithin = (at: Date | null): at is Date => at !== null && at >= span.from && at < span.until;
  return versions
    .flatMap((version) => {
      const on = isWithin(version.effectiveFrom)
        ? version.effectiveFrom
        : TELLS.has(version.state) && isWithin(version.stateSince) ? version.stateSince : null;
      if (on === null) return [];
      const parent = versions.find(({ number }) => number === version.parentNumber);
      const { changes, families } = parent ? profileDifference(parent.profile, version.profile) : { changes: [], families: [] };
      const until = version.effectiveUntil ? isoDayOf(version.effectiveUntil, zone) : null;
      return [{ number: version.number, kind: version.kind, state: version.state, families, changes, on: isoDayOf(on, zone), until }];
    })
    .toSorted((a, b) => a.number - b.number);
}
