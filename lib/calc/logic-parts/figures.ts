import { type FamilyFigures } from "./part";
import { HC_FIGURES } from "./figures/hc";
import { HCT_FIGURES } from "./figures/hct";
import { LS_FIGURES } from "./figures/ls";

/** Figures by part number, then family. Families without a generic figure are left out. */
export const FIGURES: Record<string, Record<string, FamilyFigures>> = {};

for (const [family, figures] of [
  ["HC", HC_FIGURES],
  ["HCT", HCT_FIGURES],
  ["LS", LS_FIGURES],
] as const) {
  for (const [number, row] of Object.entries(figures)) FIGURES[number] = { ...FIGURES[number], [family]: row };
}
