import type { NetPoint, PointKind } from "../netlist";
import { digitsAt, signedDigitsAt } from "./fields";
import { isNoNet } from "../no-net";
import { findShift } from "./shifted-columns";

/** Holes smaller than this are not drilled: the figure is in other units than the coordinates (seen: mils). */
const LEAST_HOLE_MM = 0.1;

export type RecordContext = {
  line: number;
  toMm(value: number): number;
  isInDegrees: boolean;
  warn(reason: string): void;
};

export type TestRecord = {
  /** As it stands in the record; empty for a point of no net. */
  net: string;
  point: NetPoint;
  /** 0: both sides, 1: primary, n: layer n; undefined: not said. */
  access: number | undefined;
};

/**
 * One record of a point; a sentence when it cannot be used. Columns are those of IPC-D-356A, counted from 0 here:
 * 3 net · 20 part · 27 pin · 31 M · 32 D and hole · 37 P or U · 38 A and access · 41 X · 49 Y · 57 X · 62 Y · 67 R · 72 S.
 */
export function readTestRecord(line: string, kind: PointKind, context: RecordContext): TestRecord | string {
  let shift = 0;
  if (line.charAt(41) !== "X" && line.slice(38, 57).trim() !== "") {
    const found = findShift(line);
    if (found === undefined) return `Column 42 should hold X and the place, not “${line.slice(41, 57).trim()}”.`;
    context.warn(`The columns are shifted by ${found}; the point is read by its letters.`);
    shift = found;
  }
  const place = readPlace(line, shift, context);
  if (typeof place === "string") return place;
  const named = shift === 0 ? line.slice(20, 26).trim() : line.slice(20, 32 + shift);
  const dash = shift === 0 ? -1 : named.lastIndexOf("-");
  const part = dash < 0 ? named.trim() : named.slice(0, dash).trim();
  const isVia = part === "VIA" || part === "via";
  const access = line.charAt(38 + shift) === "A" ? digitsAt(line, 39 + shift, 41 + shift) : undefined;
  const [width, height] = [sizeAt(line, 57 + shift, "X", context), sizeAt(line, 62 + shift, "Y", context)];
  const point: NetPoint = {
    part: isVia ? "" : part,
    pin: shift === 0 ? line.slice(27, 31).trim() : dash < 0 ? "" : named.slice(dash + 1, -1).trim(),
    kind: isVia ? "via" : kind,
    isMidPoint: line.charAt(31 + shift) === "M",
    side: null,
    xMm: place.xMm,
    yMm: place.yMm,
    holeMm: readHole(line, shift, context),
    isPlated: null,
    padWidthMm: width ?? height,
    padHeightMm: width === null ? null : height,
    turnDeg: readTurn(line, shift, context),
    mask: readMask(line, shift),
    line: context.line,
  };
  // Seen: a P in records of surface pads, too; it says something only of a hole.
  const wall = line.charAt(37 + shift);
  if (point.kind !== "surface" && (wall === "P" || wall === "U")) point.isPlated = wall === "P";
  const net = line.slice(3, 17).trim();
  return { net: isNoNet(net) ? "" : net, point, access: Number.isNaN(access) ? undefined : access };
}

type MaybePlace = { xMm: number | null; yMm: number | null };

function readPlace(line: string, shift: number, { toMm }: RecordContext): MaybePlace | string {
  const x = line.charAt(41 + shift) === "X" ? signedDigitsAt(line, 42 + shift, 49 + shift) : undefined;
  const y = line.charAt(49 + shift) === "Y" ? signedDigitsAt(line, 50 + shift, 57 + shift) : undefined;
  if (x === undefined && y === undefined) return { xMm: null, yMm: null };
  if (x === undefined || Number.isNaN(x)) return noFigure("X", line.slice(41 + shift, 49 + shift));
  if (y === undefined || Number.isNaN(y)) return noFigure("Y", line.slice(49 + shift, 57 + shift));
  return { xMm: toMm(x), yMm: toMm(y) };
}

const noFigure = (axis: string, text: string) =>
  `${axis} should be a sign and six digits, but “${text.trim()}” stands there.`;

/** A size of the pad, mm; 0 and blanks say nothing. */
function sizeAt(line: string, at: number, letter: string, { toMm, warn }: RecordContext): number | null {
  if (line.charAt(at) !== letter) return null;
  const size = digitsAt(line, at + 1, at + 5);
  if (Number.isNaN(size)) warn(`The size of the pad, “${line.slice(at, at + 5).trim()}”, is no figure.`);
  return size === undefined || Number.isNaN(size) || size === 0 ? null : toMm(size);
}

function readHole(line: string, shift: number, { toMm, warn }: RecordContext): number | null {
  if (line.charAt(32 + shift) !== "D") return null;
  const size = digitsAt(line, 33 + shift, 37 + shift);
  if (size === undefined || size === 0) return null;
  if (Number.isNaN(size)) {
    warn(`The size of the hole, “${line.slice(32 + shift, 37 + shift).trim()}”, is no figure.`);
    return null;
  }
  const holeMm = toMm(size);
  if (holeMm >= LEAST_HOLE_MM) return holeMm;
  warn(
    `A hole of ${Number(holeMm.toPrecision(3))}\u202fmm cannot be drilled: its size is in other units and not kept.`,
  );
  return null;
}

function readTurn(line: string, shift: number, { isInDegrees, warn }: RecordContext): number | null {
  if (line.charAt(67 + shift) !== "R") return null;
  const turn = digitsAt(line, 68 + shift, 71 + shift);
  if (turn === undefined || turn === 0) return turn ?? null;
  if (Number.isNaN(turn)) warn(`The turn of the pad, “${line.slice(67 + shift, 71 + shift).trim()}”, is no figure.`);
  else if (isInDegrees) return turn % 360;
  else warn("The turn of the pad is in radians, which three digits cannot hold; it is not kept.");
  return null;
}

const MASKS = ["none", "primary", "secondary", "both"] as const;

/** S in column 73; one widespread writer puts it into column 72. */
function readMask(line: string, shift: number): NetPoint["mask"] {
  const at = line.charAt(72 + shift) === "S" ? 73 : line.charAt(71 + shift) === "S" ? 72 : undefined;
  const digit = at === undefined ? undefined : digitsAt(line, at + shift, at + shift + 1);
  return digit === undefined ? null : (MASKS[digit] ?? null);
}
