import { z } from "zod";
import { writeId } from "@/lib/form/write-id";

export const benchSessionInput = z.object({ project: z.string(), writeId });
export type BenchSessionInput = z.infer<typeof benchSessionInput>;
