import type { SettingsProfile } from "./profile";

type Json = null | boolean | number | string | Json[] | { [key: string]: Json };

function canonical(value: Json): string {
  if (Array.isArray(value)) return `[${value.map(canonical).join(",")}]`;
  if (value !== null && typeof value === "object") {
    const members = Object.entries(value)
      .toSorted(([a], [b]) => (a < b ? -1 : a > b ? 1 : 0))
      .map(([key, member]) => `${JSON.stringify(key)}:${canonical(member)}`);
    return `{${members.join(",")}}`;
  }
  return JSON.stringify(value);
}

/**
 * The one text of a profile: JSON with sorted keys and no spaces. Its SHA-256 is
 * the content hash that an approval binds; the hash itself is taken outside the
 * domain. Equal profiles give equal text however their keys were ordered; the
 * order of blocks and features counts.
 */
export function canonicalProfileText(profile: SettingsProfile): string {
  return canonical(profile);
}
