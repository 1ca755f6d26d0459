import type { NetPoint } from "../netlist";

/** A pad whose size is not known: a soldered pin of the 2.54 mm grid, and a small surface pad (common practice, no source). */
const USUAL_PAD_MM = 1.6;
const USUAL_SURFACE_PAD_MM = 0.6;
const LARGEST_PAD_MM = 50;

/** Half the size of a pad along X and Y as it lies, mm. A pad at an odd angle takes the box around it. */
export function halfSize({ padWidthMm, padHeightMm, turnDeg, kind, holeMm }: NetPoint): readonly [number, number] {
  if (padWidthMm === null) {
    const usual = (kind === "surface" ? USUAL_SURFACE_PAD_MM : Math.max(USUAL_PAD_MM, (holeMm ?? 0) + 0.6)) / 2;
    return [usual, usual];
  }
  const wide = Math.min(padWidthMm, LARGEST_PAD_MM) / 2;
  if (padHeightMm === null) return [wide, wide];
  const tall = Math.min(padHeightMm, LARGEST_PAD_MM) / 2;
  if (turnDeg === null) return [Math.max(wide, tall), Math.max(wide, tall)];
  if (turnDeg % 180 === 0) return [wide, tall];
  if (turnDeg % 90 === 0) return [tall, wide];
  const [cos, sin] = [Math.abs(Math.cos((turnDeg * Math.PI) / 180)), Math.abs(Math.sin((turnDeg * Math.PI) / 180))];
  return [wide * cos + tall * sin, wide * sin + tall * cos];
}

/** Whether a tip can touch it at all. */
export const isInReach = ({ side }: NetPoint): boolean => side !== "inner";

/** Sides as bits: 1 the primary one, 2 the secondary one; both where the source does not say. */
export const sidesOf = ({ side }: NetPoint): number => (side === "primary" ? 1 : side === "secondary" ? 2 : 3);
