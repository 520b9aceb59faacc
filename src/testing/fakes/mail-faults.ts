import { z } from "zod";

/**
 * What can go amiss at a mail provider. "before" and "after" say whether the
 * letter had been taken when it did; a caller cannot tell which.
 */
export const MAIL_FAULTS = [
  "none", "429", "409", "500-before", "500-after", "hang-before", "hang-after", "reset-before", "reset-after", "garbled",
] as const;
export type MailFault = (typeof MAIL_FAULTS)[number];

export const faultSchema = z.enum(MAIL_FAULTS);

/** Sent to `PUT /faults`: a share of the coming requests goes amiss, drawn from a seed. */
export const faultPlanSchema = z.object({
  share: z.number().min(0).max(1),
  seed: z.number().int(),
  faults: z.array(faultSchema).min(1),
});
export type FaultPlan = z.infer<typeof faultPlanSchema>;

/** Draws the fault of each request in turn; the same plan always draws the same ones (mulberry32). */
export function faultDrawer({ share, seed, faults }: FaultPlan): () => MailFault {
  let state = seed >>> 0;
  const next = () => {
    state = (state + 0x6d2b79f5) >>> 0;
    let t = Math.imul(state ^ (state >>> 15), state | 1);
    t ^= t + Math.imul(t ^ (t >>> 7), t | 61);
    return ((t ^ (t >>> 14)) >>> 0) / 2 ** 32;
  };
  return () => (next() < share ? (faults[Math.floor(next() * faults.length)] ?? "none") : "none");
}
