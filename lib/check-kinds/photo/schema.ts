import { z } from "zod";
import { optionalLine } from "@/lib/form/text";

export const MOST_PHOTOS = 10;

/** expects: what the photo must show, e.g. "solder side, whole board". */
export const specShape = z.object({ expects: z.string(), minimum: z.number().int().min(1).max(MOST_PHOTOS) });
export type Spec = z.infer<typeof specShape>;

export const typedShape = z.object({ expects: z.string(), minimum: z.string() });
export type Typed = z.infer<typeof typedShape>;

const COUNT = `Ask for 1 to ${MOST_PHOTOS} photos.`;

export const specFromTyped = z.object({
  expects: optionalLine(200),
  minimum: z
    .string()
    .trim()
    .regex(/^\d{1,3}$/, COUNT)
    .transform(Number)
    .refine((count) => count >= 1 && count <= MOST_PHOTOS, COUNT),
});
