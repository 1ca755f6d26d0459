import type { z } from "zod";
import type { Reply } from "@/components/ui/form/reply";
import { FIGURE_NAMES, writeFigure, type FigureName } from "@/lib/family/figure-list";
import type { FamilyLine } from "@/lib/family/load-families";
import type { removeFamilyInput, saveFamilyInput } from "@/lib/family/schema";
import type { Family } from "@/lib/calc/levels";

export type SaveFamily = (
  input: z.input<typeof saveFamilyInput>,
) => Promise<Reply<{ id: string; name: string; version: number }>>;
export type RemoveFamily = (input: z.input<typeof removeFamilyInput>) => Promise<Reply<{ name: string }>>;

export type FamilyActs = { save: SaveFamily; remove: RemoveFamily };

/** The figure as it is written on screen: "3.84 V"; empty where the sheet says nothing. */
export function figureText(family: Omit<Family, "name">, name: FigureName): string {
  if (name === "minVolts" || name === "maxVolts") return writeFigure(name, family.supply?.[name]);
  return writeFigure(name, family[name]);
}

/** A form's texts from a family's figures. */
export const typedFigures = (family: Omit<Family, "name"> | undefined) =>
  // One text a figure; Object.fromEntries() forgets the keys that it is given.
  Object.fromEntries(FIGURE_NAMES.map((name) => [name, family ? figureText(family, name) : ""])) as Record<
    FigureName,
    string
  >;

/** What the table shows of a family: symbols of the data sheet, with the figures that belong together in one cell. */
export const COLUMNS: readonly { header: string; title: string; text: (family: Family) => string }[] = [
  { header: "VCC", title: "Supply the figures are for", text: (family) => figureText(family, "volts") },
  { header: "VIH", title: "Lowest high an input takes", text: (family) => figureText(family, "vihMin") },
  { header: "VIL", title: "Highest low an input takes", text: (family) => figureText(family, "vilMax") },
  { header: "VOH", title: "Lowest high an output gives", text: (family) => figureText(family, "vohMin") },
  { header: "at IOH", title: "Current at that high", text: (family) => figureText(family, "iohA") },
  { header: "VOL", title: "Highest low an output gives", text: (family) => figureText(family, "volMax") },
  { header: "at IOL", title: "Current at that low", text: (family) => figureText(family, "iolA") },
  { header: "IIH", title: "Current into an input at high", text: (family) => figureText(family, "iihA") },
  { header: "IIL", title: "Current out of an input at low", text: (family) => figureText(family, "iilA") },
  { header: "IOZ", title: "Leak of an output that is off", text: (family) => figureText(family, "iozA") },
  { header: "CI", title: "Capacitance of an input", text: (family) => figureText(family, "inputPf") },
  { header: "CO", title: "Capacitance of an output that is off", text: (family) => figureText(family, "outputPf") },
  { header: "tpd", title: "Typical delay into 50 pF", text: (family) => figureText(family, "tpdTypicalS") },
  { header: "Edge", title: "Of an output into 50 pF, 10–90 %", text: (family) => figureText(family, "edgeS") },
];

export const isOwn = (line: FamilyLine): line is FamilyLine & { id: string } => line.id !== null;
