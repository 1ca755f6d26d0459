import type { NetPoint } from "./netlist";

/** A pin of which no more is known than its name. */
export const BARE_PIN = {
  kind: "pin",
  isMidPoint: false,
  side: null,
  holeMm: null,
  isPlated: null,
  padWidthMm: null,
  padHeightMm: null,
  turnDeg: null,
  mask: null,
} as const satisfies Partial<NetPoint>;
