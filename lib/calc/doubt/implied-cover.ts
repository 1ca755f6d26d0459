import type { CoveringCheck, Covers, Rework } from "./rework";

/**
 * What a check covers without saying so. Common practice, no source.
 * - A check that states nothing covers its whole board: any rework of the board puts it in doubt, only that a change of
 *   firmware or of a table moves neither joints nor copper nor current, so inspection, continuity and power-on stay.
 * - A swapped part may draw another current: power-on checks of its unit are in doubt whatever they state.
 */
export function impliedCover({ kind, unitId }: Rework, check: CoveringCheck): string | undefined {
  if (check.unitId !== unitId) return undefined;
  if (kind === "part swap" && check.stage === "power-on") {
    return `A part is swapped, and ${check.serial} may draw another current.`;
  }
  if (!statesNothing(check.covers) || !reaches(kind, check)) return undefined;
  return "It does not say what it covers, so it counts for the whole board.";
}

const reaches = (kind: Rework["kind"], { stage }: CoveringCheck): boolean =>
  kind !== "firmware" || stage === "function" || stage === "integration";

export const statesNothing = ({ signals, pins, rails, blocks }: Covers): boolean =>
  [signals, pins, rails, blocks].every((list) => list.length === 0);
