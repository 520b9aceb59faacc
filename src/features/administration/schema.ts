import { z } from "zod";

export const verifyCredentialInput = z.object({ userId: z.uuid() });
