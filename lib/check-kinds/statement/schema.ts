import { z } from "zod";
import { optionalLine } from "@/lib/form/text";

/** What one should find, e.g. "no bridge, all pins wetted"; empty when the title says it all. */
export const specShape = z.object({ expects: z.string() });
export type Spec = z.infer<typeof specShape>;

export const typedShape = specShape;
export const specFromTyped = z.object({ expects: optionalLine(200) });
