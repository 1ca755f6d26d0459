import type { Net } from "../netlist";
import type { IpcHeader } from "./header";
import type { IpcScale } from "./scale";

/** A sentence when the units are not certain, with the size of the board that comes of them; empty when they are. */
export function unitsWarning(header: IpcHeader, nets: readonly Net[], ownScale: IpcScale | undefined): string {
  if (ownScale !== undefined) return "";
  const doubt =
    header.unitsLine === 0 ? "The header names no units; steps of 0.0001 inch are taken." : header.unitsDoubt;
  return doubt === "" ? "" : `${doubt} ${sizeSentence(nets)}`.trim();
}

function sizeSentence(nets: readonly Net[]): string {
  let [left, right, low, high] = [Infinity, -Infinity, Infinity, -Infinity];
  for (const { points } of nets) {
    for (const { xMm, yMm } of points) {
      if (xMm === null || yMm === null) continue;
      [left, right] = [Math.min(left, xMm), Math.max(right, xMm)];
      [low, high] = [Math.min(low, yMm), Math.max(high, yMm)];
    }
  }
  if (left > right) return "";
  const size = (value: number) => Number(value.toPrecision(3));
  return `The points lie within ${size(right - left)} × ${size(high - low)}\u202fmm; if the board is of another size, choose the units yourself.`;
}
