import { computed, fault, needsPositive, type Computed } from "../computed";
import { roundedVolts } from "./exact";
import type { Family, SupplyRange } from "./family";
import { volts as inVolts } from "./wording";

/** Thresholds made for TTL outputs: 2.0 V and 0.8 V whatever the supply. */
export const hasTtlThresholds = ({ vihMin, vilMax }: Family): boolean => vihMin === 2 && vilMax === 0.8;

/** The supplies at which the family may be used by its figures. */
export function supplyRange({ supply, volts }: Family): SupplyRange {
  if (supply) return supply;
  const fiveVolts = volts >= 4.5 && volts <= 5.5;
  return fiveVolts ? { minVolts: 4.5, maxVolts: 5.5 } : { minVolts: volts * 0.9, maxVolts: volts * 1.1 };
}

/**
 * The family's figures at another supply.
 *
 * - CMOS thresholds keep their share of the supply: 0.7 and 0.3 VCC for HC, AC and AHC down to 3 V (below, their sheets
 *   give 0.75 and 0.25 at 2 V), for LVC from 4.5 V. TTL thresholds (2.0 V, 0.8 V) stay.
 * - CMOS outputs stay as far from their rails; below the supply that the figures are for, their currents shrink with its
 *   square (AC and AHC sheets halve them from 4.5 V to 3 V, where the square gives 0.44: on the safe side), to the
 *   microampere. Bipolar outputs keep their worst case, though their high level rises with the supply.
 * - Refused outside the family's range (Family.supply): outside it the shares no longer hold.
 *
 * Source: the sheets named in the family table; the rules are a modelling choice, computed from them.
 * Leaves out: delay, edge and input currents, which stay as given; a CMOS gate at 3 V is about half as slow again.
 */
export function familyAt(family: Family, volts: number): Computed<Family> {
  const bad =
    needsPositive("volts", "supply", volts) ?? needsPositive("family", `supply of ${family.name}`, family.volts);
  if (bad) return bad;
  const supply = supplyRange(family);
  if (volts < supply.minVolts || volts > supply.maxVolts) return fault("volts", outside(family, supply, volts));
  if (volts === family.volts) return computed(family);
  const follows = family.technology === "CMOS" && !hasTtlThresholds(family);
  return computed({
    ...family,
    volts,
    supply,
    ...(follows ? thresholdsAt(family, volts) : {}),
    ...(family.technology === "CMOS" ? outputAt(family, volts) : {}),
  });
}

function thresholdsAt({ vihMin, vilMax, volts: given }: Family, volts: number) {
  return { vihMin: roundedVolts((vihMin * volts) / given), vilMax: roundedVolts((vilMax * volts) / given) };
}

function outputAt({ vohMin, iohA, iolA, volts: given }: Family, volts: number) {
  const weaker = Math.min(1, volts / given) ** 2;
  const current = (amperes: number) => (weaker === 1 ? amperes : Math.floor(amperes * weaker * 1e6) / 1e6);
  return { vohMin: roundedVolts(vohMin + volts - given), iohA: current(iohA), iolA: current(iolA) };
}

function outside({ name }: Family, { minVolts, maxVolts }: SupplyRange, volts: number): string {
  const range = `from ${inVolts(minVolts)} to ${inVolts(maxVolts)}`;
  return `The figures of ${name} hold ${range}, not at ${inVolts(volts)}: enter those of the data sheet.`;
}
