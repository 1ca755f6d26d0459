import { z } from "zod";

const share = z.number().min(0).max(1);
const spread = z.object({ typical: share, worst: share });
const common = { label: z.string(), rail: z.string(), count: z.int().min(1) };

/** Something of a board besides its packages, as it is kept; kinds and units of lib/calc/power, and the whole board. */
export const powerLineItem = z.discriminatedUnion("kind", [
  z.object({ kind: z.literal("led"), ...common, forwardVolts: z.number(), ohm: z.number(), lit: spread }),
  z.object({ kind: z.literal("pull-up"), ...common, ohm: z.number(), lowVolts: z.number(), lowShare: spread }),
  z.object({
    kind: z.literal("regulator"),
    label: z.string(),
    rail: z.string(),
    output: z.string(),
    outputVolts: z.number(),
    type: z.discriminatedUnion("kind", [
      z.object({ kind: z.literal("linear"), groundA: z.number() }),
      z.object({ kind: z.literal("switching"), efficiency: z.number() }),
    ]),
  }),
  z.object({ kind: z.literal("fixed"), ...common, typicalA: z.number(), worstA: z.number(), atRest: share }),
  /** Typed in or measured for all of the board; stands instead of the computed sum. */
  z.object({
    kind: z.literal("whole"),
    label: z.string(),
    rail: z.string(),
    typicalA: z.number(),
    worstA: z.number(),
  }),
]);
export type PowerLineItem = z.output<typeof powerLineItem>;
