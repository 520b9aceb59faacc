import { z } from "zod";
import { listOf, tick } from "@/domain/form-text";
import { DECLINE_REASONS, RETURN_REASONS, REVIEW_CHECKLIST } from "./constants";

const target = {
  journalId: z.uuid(),
  number: z.coerce.number().int().min(1).max(100_000),
  /** What was shown; the decision binds it. */
  contentHash: z.string().regex(/^[0-9a-f]{64}$/),
};
const remarks = z.string().trim().max(2000, "At most 2000 characters.");
const codes = <Code extends string>(list: Readonly<Record<Code, string>>) => Object.keys(list) as [Code, ...Code[]];

export const reviewPageInput = z.object({ journalId: z.uuid(), number: target.number });

export const approveVersionInput = z.object({
  ...target,
  checklist: listOf(codes(REVIEW_CHECKLIST)).refine((ticked) => ticked.length === codes(REVIEW_CHECKLIST).length, "Go through each point and tick it."),
  reviewOn: z.iso.date("Type the date of the next review."),
  remarks,
  isSigned: tick.refine((value) => value, "Sign to approve."),
});
export type ApproveVersionInput = z.input<typeof approveVersionInput>;

export const returnVersionInput = z.object({
  ...target,
  reason: z.enum(codes(RETURN_REASONS), { error: "Choose a reason from the list." }),
  remarks: remarks.min(1, "Say what to mend, so that the person can."),
});
export type ReturnVersionInput = z.input<typeof returnVersionInput>;

export const declineVersionInput = z.object({
  ...target,
  reason: z.enum(codes(DECLINE_REASONS), { error: "Choose a reason from the list." }),
  remarks: remarks.min(1, "Say why, in words the person can use."),
});
export type DeclineVersionInput = z.input<typeof declineVersionInput>;
