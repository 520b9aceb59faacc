import { z } from "zod";

export const journalInput = z.object({ journalId: z.uuid() });

export const comparisonInput = z.object({
  journalId: z.uuid(),
  number: z.coerce.number().int().min(1).max(100_000),
});
