import { z } from "zod";
import { figure } from "@/lib/form/figure-field";
import { line } from "@/lib/form/text";
import { writeId } from "@/lib/form/write-id";

/** What the plan takes for granted, as typed. */
export const saveConditionsInput = z.object({
  project: z.string(),
  writeId,
  /** 0 while nobody has set them. */
  version: z.int(),
  ambientC: figure("°C", "Say how warm the air at the connectors gets.", { least: -40, most: 125, example: "40 °C" }),
  logicVolts: figure("V", "Say what the logic runs from.", { least: 0.8, most: 24, example: "5 V" }),
  logicRail: line(40, "Name the rail that the logic runs from."),
  pinCapacitancePf: figure("F", "Say what one connector pin with its copper adds.", {
    least: 0,
    most: 1e-9,
    example: "5 pF",
  }).transform((farad) => Number((farad * 1e12).toPrecision(9))),
  sparesPercent: figure("%", "Say how many spare parts to order, or 0.", { least: 0, most: 200, example: "10 %" }),
  currency: z
    .string({ message: "Name the currency." })
    .trim()
    .toUpperCase()
    .regex(/^[A-Z]{3}$/, "Name the currency by its three letters (ISO 4217): EUR."),
});
export type SaveConditionsInput = z.output<typeof saveConditionsInput>;

/** Figures as they are kept: °C, V, pF, per cent. */
export const conditionsNow = z.object({
  ambientC: z.number(),
  logicVolts: z.number(),
  logicRail: z.string(),
  pinCapacitancePf: z.number(),
  sparesPercent: z.number(),
  currency: z.string(),
  version: z.int(),
});
export type Conditions = z.output<typeof conditionsNow>;
