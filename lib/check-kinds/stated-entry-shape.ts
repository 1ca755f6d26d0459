import { z } from "zod";
import type { StatedEntry } from "./stated-verdict";

export const statedEntryShape: z.ZodType<StatedEntry> = z.object({ conforms: z.boolean().nullable() });
