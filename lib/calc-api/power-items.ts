import { z } from "zod";
import { computed, fault, type Computed } from "@/lib/calc/computed";
import { FAMILIES, findFamily } from "@/lib/calc/levels";
import { findPart } from "@/lib/calc/logic-parts";
import { packageItem, type PowerItem } from "@/lib/calc/power";
import {
  amps,
  count,
  countFromZero,
  from,
  hertz,
  name,
  ohms,
  picofarads,
  share,
  spreadTo,
  volts,
  voltsFromZero,
} from "./fields";

const common = { label: name, rail: name, count };
const MOST_HZ = 1e12;

const part = z
  .strictObject({
    kind: z.literal("part"),
    number: z.string().max(20).describe("Without series and family: 283 of 74HC283."),
    family: z.string().max(40).default("HC"),
    rail: name,
    count,
    gatesUsed: countFromZero.describe("Over all of them."),
    clockHz: hertz,
    activity: share.default(0.25).describe("Share of the lines that change at a clock edge, typically."),
    loadPf: picofarads.default(50),
  })
  .describe("A logic part of the built-in list at work on a board.");

const packageFigures = z
  .strictObject({
    kind: z.literal("package"),
    ...common,
    staticA: spreadTo(100).nullable(),
    cpdPf: picofarads.nullable(),
    switching: from(0, 1000).default(1),
    inputHz: spreadTo(MOST_HZ),
    outputs: from(0, 1000),
    outputHz: spreadTo(MOST_HZ),
    loadPf: picofarads.default(50),
    ttlInputs: z.strictObject({ count: countFromZero, extraA: amps, highShare: share }).nullable().default(null),
  })
  .describe("A logic package by the figures of its data sheet.");

export const powerItem = z.discriminatedUnion("kind", [
  part,
  packageFigures,
  z.strictObject({ kind: z.literal("led"), ...common, forwardVolts: voltsFromZero, ohm: ohms, lit: spreadTo(1) }),
  z.strictObject({ kind: z.literal("pull-up"), ...common, ohm: ohms, lowVolts: voltsFromZero, lowShare: spreadTo(1) }),
  z.strictObject({
    kind: z.literal("regulator"),
    label: name,
    rail: name,
    output: name,
    outputVolts: volts,
    type: z.discriminatedUnion("kind", [
      z.strictObject({ kind: z.literal("linear"), groundA: amps }),
      z.strictObject({ kind: z.literal("switching"), efficiency: z.number().min(0.01).max(1) }),
    ]),
  }),
  z.strictObject({ kind: z.literal("fixed"), ...common, typicalA: amps, worstA: amps, atRest: share.default(1) }),
]);
type Given = z.output<typeof powerItem>;

/** Items as the calculation takes them; parts of the list with their figures. */
export function itemsOf(given: readonly Given[]): Computed<PowerItem[]> {
  const items: PowerItem[] = [];
  for (const [index, item] of given.entries()) {
    if (item.kind !== "part") {
      items.push(item);
      continue;
    }
    const found = findPart(item.number);
    const family = findFamily(FAMILIES, item.family);
    if (!found) return fault(`items/${index}/number`, `There is no part ${item.number} in the list.`);
    if (!family) return fault(`items/${index}/family`, `There is no family ${item.family} in the list.`);
    items.push(packageItem(found, item.count, item.gatesUsed, { ...item, family }));
  }
  return computed(items);
}
