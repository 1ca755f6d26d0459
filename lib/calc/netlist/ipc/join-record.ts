import type { NetPoint } from "../netlist";

/** Adds what a continuation (017, 027) says of the same point: its hole, or a pad where none was named yet. */
export function joinRecord(point: NetPoint, more: NetPoint): void {
  point.holeMm ??= more.holeMm;
  point.isPlated ??= more.isPlated;
  point.mask ??= more.mask;
  if (point.padWidthMm === null) {
    [point.padWidthMm, point.padHeightMm, point.turnDeg] = [more.padWidthMm, more.padHeightMm, more.turnDeg];
  }
  if (point.xMm === null) [point.xMm, point.yMm] = [more.xMm, more.yMm];
}
