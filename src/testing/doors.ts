import { REVIEW_CHECKLIST } from "@/features/review/constants";

/** What a door needs of whoever knocks. "journal": a grant on the journal, of a role strong enough. */
type Door = Readonly<{
  opensTo: "anyone" | "signed-in" | "administrator" | "journal";
  /** A body that is well formed, so that only the actor decides; "a|b" is a name sent twice. */
  sample: Readonly<Record<string, string>>;
  /** The field that is spoilt, and by what; null where a body carries nothing. */
  spoilt: readonly [string, string] | null;
  /** A role in the journal that is too weak, "none" where all of the circle may; for a journal's doors. */
  weak?: "mentor" | "educator" | "family" | "person" | "none";
}>;

const J = "JOURNAL";
const ID = "00000000-0000-4000-8000-000000000001";
const HASH = "a".repeat(64);
const LINK = "A".repeat(43);
const PASSWORD = "seven quiet boats at dawn";
const AT = "2026-03-10T08:00";
const owner = (sample: Record<string, string>, spoilt: readonly [string, string], weak: Door["weak"] = "mentor"): Door => ({
  opensTo: "journal", sample: { journalId: J, ...sample }, spoilt, weak,
});

/** Every server action, by name. An action without a row here fails the suite. */
export const DOORS: Readonly<Record<string, Door>> = {
  signUpAction: { opensTo: "anyone", sample: { displayName: "A", email: "a@example.org", password: PASSWORD, timeZone: "UTC", isAdultOrHelper: "on" }, spoilt: ["email", "none"] },
  signInAction: { opensTo: "anyone", sample: { email: "a@example.org", password: PASSWORD }, spoilt: ["email", "none"] },
  demoSignInAction: { opensTo: "anyone", sample: { role: "person" }, spoilt: ["role", "king"] },
  verifyEmailAction: { opensTo: "anyone", sample: { token: LINK }, spoilt: ["token", "x"] },
  requestResetAction: { opensTo: "anyone", sample: { email: "a@example.org" }, spoilt: ["email", "none"] },
  resetPasswordAction: { opensTo: "anyone", sample: { token: LINK, password: PASSWORD }, spoilt: ["password", "short"] },
  unsubscribeAction: { opensTo: "anyone", sample: { token: "x.y" }, spoilt: ["token", ""] },
  signOutAction: { opensTo: "signed-in", sample: {}, spoilt: null },
  resendVerificationAction: { opensTo: "signed-in", sample: {}, spoilt: null },
  updateProfileAction: { opensTo: "signed-in", sample: { displayName: "A", timeZone: "UTC", glucoseUnit: "mg/dL" }, spoilt: ["timeZone", "Moon"] },
  changePasswordAction: { opensTo: "signed-in", sample: { currentPassword: "x", password: PASSWORD }, spoilt: ["password", "short"] },
  endSessionAction: { opensTo: "signed-in", sample: { sessionId: HASH }, spoilt: ["sessionId", "x"] },
  submitCredentialAction: { opensTo: "signed-in", sample: { profession: "a", licenceNumber: "b", jurisdiction: "c", expiresOn: "2099-01-01" }, spoilt: ["expiresOn", "soon"] },
  createTokenAction: { opensTo: "signed-in", sample: { label: "a", scope: "read" }, spoilt: ["scope", "own"] },
  revokeTokenAction: { opensTo: "signed-in", sample: { tokenId: ID }, spoilt: ["tokenId", "x"] },
  saveDigestPreferenceAction: { opensTo: "signed-in", sample: { level: "links", weekday: "1", minuteOfDay: "08:00" }, spoilt: ["level", "all"] },
  sendDigestNowAction: { opensTo: "signed-in", sample: {}, spoilt: null },
  createJournalAction: { opensTo: "signed-in", sample: { name: "n", glucoseUnit: "mg/dL", timeZone: "UTC", therapy: "pump", plannedStartOn: "", pump: "", sensor: "", controller: "", insulin: "" }, spoilt: ["therapy", "hope"] },
  acceptInvitationAction: { opensTo: "signed-in", sample: { token: LINK }, spoilt: ["token", "x"] },
  verifyCredentialAction: { opensTo: "administrator", sample: { userId: ID }, spoilt: ["userId", "x"] },

  saveStepAction: owner({ step: "margin", rowVersion: "1" }, ["step", "nowhere"]),
  chooseTextAction: owner({ step: "basal", rowVersion: "1", keep: "saved" }, ["keep", "both"]),
  proposeStartAction: owner({ rowVersion: "1" }, ["rowVersion", "x"], "family"),
  recordStartAction: owner({ rowVersion: "1", note: "", effectiveFrom: "", isKnowing: "on", hasKetoneStrips: "on", hasFastCarbohydrate: "on" }, ["isKnowing", ""], "educator"),
  planStartAction: owner({ plannedStartOn: "2026-03-01" }, ["plannedStartOn", "soon"]),
  startJournalAction: owner({ startedOn: "2026-03-01", hasKetoneStrips: "on", hasFastCarbohydrate: "on" }, ["startedOn", "soon"], "educator"),
  saveCardAction: owner({ previousSetup: "Pens.", longActingUnits: "", rapidUnits: "", emergencyNumber: "112", "contacts.0.name": "Bo", "contacts.0.phone": "1" }, ["longActingUnits", "some"], "educator"),
  writeDosesAction: owner({ longActingUnits: "12", rapidUnits: "" }, ["longActingUnits", "some"], "mentor"),
  changeSettingAction: owner(
    { baseVersion: "1", setting: "basal", from: "00:00", to: "04:00", value: "0.5", targetLow: "", targetHigh: "", reason: "pattern-high", reasonText: "", expectedOutcome: "lows", expectedWindow: "night", expectedDirection: "fall", lookAgainOn: "", revertRule: "" },
    ["from", "noon"], "educator",
  ),
  putIntoEffectAction: owner({ number: "1", contentHash: HASH, effectiveFrom: "" }, ["contentHash", "x"], "educator"),
  withdrawVersionAction: owner({ number: "1" }, ["number", "x"]),
  returnToVersionAction: owner({ number: "1" }, ["number", "x"]),
  approveVersionAction: owner(
    { number: "1", contentHash: HASH, checklist: Object.keys(REVIEW_CHECKLIST).join("|"), reviewOn: "2099-01-01", remarks: "", isSigned: "on" },
    ["reviewOn", "soon"], "person",
  ),
  returnVersionAction: owner({ number: "1", contentHash: HASH, reason: "other", remarks: "why" }, ["reason", "x"], "mentor"),
  declineVersionAction: owner({ number: "1", contentHash: HASH, reason: "other", remarks: "why" }, ["reason", "x"], "mentor"),
  runImportAction: owner(
    { importId: ID, encoding: "utf-8", delimiter: ",", headerRow: "0", timeColumn: "0", dateColumn: "none", glucoseColumn: "1", subjectColumn: "none", subject: "none", dateOrder: "day-first", unit: "mg/dL", timeZone: "UTC", shiftMinutes: "0" },
    ["timeZone", "Moon"],
  ),
  undoImportAction: owner({ importId: ID }, ["importId", "x"]),
  logMealAction: owner({ at: AT, carbohydrateGrams: "40", label: "", speed: "mixed" }, ["carbohydrateGrams", "many"]),
  logDoseAction: owner({ at: AT, units: "3", doseKind: "meal", timing: "with" }, ["units", "many"]),
  logNoteAction: owner({ at: AT, text: "a note" }, ["text", ""]),
  logKetonesAction: owner({ at: AT, ketonesMmolPerL: "0.2" }, ["ketonesMmolPerL", "many"]),
  removeEntryAction: owner({ entryId: ID }, ["entryId", "x"]),
  setFlagAction: owner({ code: "stress", firstDay: "2026-03-01", lastDay: "2026-03-01", note: "" }, ["code", "x"]),
  inviteHelperAction: owner({ email: "a@example.org", role: "mentor", scopes: "glucose", until: "" }, ["email", "none"]),
  withdrawInvitationAction: owner({ invitationId: ID }, ["invitationId", "x"]),
  limitHelperAction: owner({ userId: ID, scopes: "glucose", until: "" }, ["userId", "x"]),
  removeHelperAction: owner({ userId: ID }, ["userId", "x"]),
  leaveCircleAction: owner({}, ["journalId", "x"], "person"),
  addCommentAction: owner({ subject: "version", subjectKey: "1", kind: "comment", body: "hello" }, ["body", ""], "none"),
  markCommentsReadAction: owner({ readUpTo: "2026-03-10T08:00:00Z" }, ["readUpTo", "x"], "none"),
};
