import { z } from "zod";
import { FAMILIES, familyAt, findFamily, type Family } from "@/lib/calc/levels";
import { computed, fault, type Computed } from "@/lib/calc/computed";
import { amps, name, picofarads, seconds, volts, voltsFromZero } from "./fields";

const own = z.strictObject({
  name,
  technology: z.enum(["CMOS", "bipolar"]),
  volts,
  vihMin: voltsFromZero,
  vilMax: voltsFromZero,
  vohMin: voltsFromZero,
  iohA: amps,
  volMax: voltsFromZero,
  iolA: amps,
  iihA: amps,
  iilA: amps,
  iozA: amps.default(0),
  inputPf: picofarads.default(5),
  outputPf: picofarads.default(10),
  tpdTypicalS: seconds.nullable().default(null),
  edgeS: seconds.default(7e-9),
  inputMaxVolts: volts.nullable().default(null),
  source: z.string().max(200).default("the request"),
});

/** A family of the built-in table by its name ("HC", "74LS"), or the data sheet's figures; currents as magnitudes. */
export const familyField = z
  .union([z.string().trim().min(1).max(40), own])
  .describe(`One of ${FAMILIES.map((family) => family.name).join(", ")}, or the data sheet's figures.`);
type FamilyField = z.output<typeof familyField>;

/** The figures of a named or given family at the supply of the request. */
export function familyOf(field: string, given: FamilyField, supplyVolts?: number): Computed<Family> {
  const found = typeof given === "string" ? findFamily(FAMILIES, given) : given;
  if (!found) {
    const known = FAMILIES.map((family) => family.name).join(", ");
    return fault(
      field,
      `There is no family ${String(given)} here. There are ${known}; or give the figures of its data sheet.`,
    );
  }
  if (supplyVolts === undefined) return computed(found);
  const moved = familyAt(found, supplyVolts);
  return moved.ok ? moved : fault(field, moved.message);
}
