import type { StartingProfileRequest } from "./starting-profile-request";

/** Twelve plain noes. */
export const OPEN_GATE: StartingProfileRequest["gate"] = {
  pregnant: "no",
  under18: "no",
  recentSevereLow: "no",
  recentKetoacidosis: "no",
  impairedAwareness: "no",
  kidneyLiverAdrenal: "no",
  steroids: "no",
  acuteIllness: "no",
  eatingDisorder: "no",
  sglt2Inhibitor: "no",
  firstEverPump: "no",
  frailOrCognitive: "no",
};

/** The reference person of settings.md 3.2: 80 kg, 40 U a day by injection, gate open. */
export const REFERENCE_REQUEST: StartingProfileRequest = {
  weightKg: 80,
  ageYears: 40,
  injectionsTotalDailyDoseUnits: 40,
  hypoProne: false,
  insulinStepUnits: 0.05,
  gate: OPEN_GATE,
  forReview: false,
  glucoseUnit: "mg/dL",
};
