/** The part someone plays in the demo. */
export type DemoRole = "person" | "mentor" | "educator" | "family" | "administrator";

/** The invented people of the demo (content.md 13). No address of theirs can receive mail. */
export const DEMO_PEOPLE = {
  person: { name: "Ilka Brandvold", email: "ilka@demo.example", credential: null },
  mentor: { name: "Tobias Okafor-Lind", email: "tobias@demo.example", credential: null },
  educator: { name: "Marguerite Asante", email: "marguerite@demo.example", credential: "RN" },
  family: { name: "Signe Brandvold", email: "signe@demo.example", credential: null },
  administrator: { name: "Dov Hallett", email: "dov@demo.example", credential: null },
} as const satisfies Record<DemoRole, { name: string; email: string; credential: string | null }>;

/** What the demo's person typed about herself before she began; the gate is open. */
export const DEMO_BACKGROUND = {
  ageYears: 38,
  weightKg: 71,
  injectionsTotalDailyDoseUnits: 40,
  occupation: "shift baker",
  longActingMilliUnits: 20_000,
  rapidMilliUnits: 20_000,
  basalStepMilliUnits: 50,
  bolusStepMilliUnits: 50,
} as const;
