import { z } from "zod";

const seconds = z.number().nonnegative().nullable();
const condition = z.object({ volts: z.number(), loadPf: z.number() });

/** A delay path as it is stored. Figures that are null come from the part's data when it is worked out. */
export const pathShape = z.object({
  /** What a capture of it measures: "A0 rising to S15, at 50 %". */
  measure: z.string(),
  steps: z.array(
    z.object({
      /** Number of a logic part, built in or own; empty: something else, by its name. */
      part: z.string(),
      family: z.string(),
      name: z.string(),
      count: z.int(),
      minS: seconds,
      typicalS: seconds,
      maxS: seconds,
    }),
  ),
  unknownMinShare: z.number().nullable(),
  unknownMaxShare: z.number().nullable(),
  derating: z.object({ family: z.string(), typicalAt: condition, limitsAt: condition, board: condition }).nullable(),
  clock: z
    .object({
      clockToOutputMaxS: z.number(),
      setupS: z.number(),
      skewS: z.number(),
      holdS: seconds,
      clockToOutputMinS: seconds,
    })
    .nullable(),
});
export type StoredPath = z.infer<typeof pathShape>;
