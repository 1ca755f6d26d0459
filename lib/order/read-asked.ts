import { z } from "zod";

const first = (value: unknown) => (Array.isArray(value) ? value[0] : value);

const asked = z.object({
  time: z.preprocess(first, z.string().max(60)).catch("45 minutes"),
  builders: z
    .preprocess(first, z.enum(["1", "2"]))
    .catch("1")
    .transform((count) => (count === "2" ? 2 : 1)),
});

/** What the address asks for; forty-five minutes for one builder when it asks for nothing that can be read. */
export const readAsked = (search: Record<string, unknown>) => asked.parse(search);
