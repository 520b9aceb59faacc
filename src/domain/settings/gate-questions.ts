/** "not-sure" counts as yes, and so does a question that was not answered. */
export type GateAnswer = "yes" | "no" | "not-sure";

/**
 * The questions that come before any number (content.md 7). `reason` is what an
 * answer other than no is called afterwards; it judges nothing and carries no
 * figure. The list is our own, common practice without a source, except for the
 * cut-offs of awareness that the educator uses (settings.md 4.8).
 */
export const GATE_QUESTIONS = {
  pregnant: {
    question: "Are you pregnant, trying, or breast-feeding?",
    reason: "Pregnant, planning a pregnancy, or breast-feeding.",
  },
  under18: { question: "Are you under 18?", reason: "Under eighteen years of age." },
  recentSevereLow: {
    question: "In the last 12 months, did you need someone's help for a low, or pass out?",
    reason: "A low in the last twelve months that needed someone's help.",
  },
  recentKetoacidosis: {
    question: "In the last 12 months, were you treated for ketoacidosis?",
    reason: "Ketoacidosis in the last twelve months.",
  },
  impairedAwareness: {
    question: "Do you often not feel lows coming?",
    reason: "Lows that come without being felt.",
  },
  kidneyLiverAdrenal: {
    question: "Do you have kidney, liver or adrenal disease?",
    reason: "Kidney, liver or adrenal disease.",
  },
  steroids: { question: "Are you taking steroids now?", reason: "Steroids at present." },
  acuteIllness: {
    question: "Are you ill today, or have you had ketones this week?",
    reason: "Ill today, or ketones this week.",
  },
  eatingDisorder: {
    question: "Has eating or skipping insulin been hard for you?",
    reason: "Eating or skipped insulin has been hard.",
  },
  sglt2Inhibitor: {
    question: "Do you take a tablet whose name ends in -gliflozin?",
    reason: "A tablet whose name ends in -gliflozin.",
  },
  firstEverPump: { question: "Would this be your first pump?", reason: "A first pump." },
  frailOrCognitive: {
    question: "Does someone else manage your insulin because of memory or frailty?",
    reason: "Insulin is managed by someone else because of memory or frailty.",
  },
} as const satisfies Record<string, { question: string; reason: string }>;

export type GateQuestion = keyof typeof GATE_QUESTIONS;
export type GateAnswers = Readonly<Partial<Record<GateQuestion, GateAnswer | null | undefined>>>;

/** What is said after a yes (content.md 7). */
export const GATE_CLOSED_TEXT =
  "Thank you. We keep your answers and show the arithmetic to your educator, not here. You can still fill in everything.";
