import { formatQuantity, type Unit } from "@/lib/calc/units";
import { INLET, type RailNow, type SaveRailTyped } from "./schema";

type Typed = Omit<SaveRailTyped, "project" | "writeId" | "rail" | "version">;

const write = (value: number | null | undefined, unit: Unit) =>
  value === null || value === undefined ? "" : formatQuantity({ value, unit });

/** A rail as its form holds it; without one the form of a new rail. */
export function typedRail(rail?: RailNow): Typed {
  if (!rail) {
    const blank = { name: "", volts: "", capacityA: "", source: INLET, segmentMm: "", widthMm: "", thicknessUm: "" };
    return { ...blank, tolerancePercent: "5 %" } satisfies Typed;
  }
  const { copper } = rail;
  return {
    name: rail.name,
    volts: write(rail.volts, "V"),
    tolerancePercent: write(rail.tolerancePercent, "%"),
    capacityA: write(rail.capacityA, "A"),
    source: rail.sourceBoardId ?? INLET,
    segmentMm: write(copper && copper.segmentMm / 1e3, "m"),
    widthMm: write(copper && copper.widthMm / 1e3, "m"),
    thicknessUm: write(copper && copper.thicknessUm / 1e6, "m"),
  };
}
