import { z } from "zod";
import { optionalLine } from "@/lib/form/text";

/** expects: what the capture must show, e.g. "CLK at U3 pin 9, 20 ns/div". */
export const specShape = z.object({ expects: z.string() });
export type Spec = z.infer<typeof specShape>;

export const typedShape = specShape;
export const specFromTyped = z.object({ expects: optionalLine(200) });
