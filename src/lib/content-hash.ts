import { createHash } from "node:crypto";
import { canonicalProfileText } from "@/domain/settings/content-hash";
import type { SettingsProfile } from "@/domain/settings/profile";

/** SHA-256, hex, of a profile's canonical text: what an approval binds. */
export function hashProfile(profile: SettingsProfile): string {
  return createHash("sha256").update(canonicalProfileText(profile)).digest("hex");
}
