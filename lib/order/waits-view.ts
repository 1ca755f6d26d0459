import type { PlacedBox, PlacedLine } from "./lay-out-graph";
import type { CheckName } from "./tonight-view";

export type { CheckName };

export type WaitLine = { check: CheckName; needs: CheckName };
export type CheckBox = PlacedBox & CheckName;

export type WaitsView = {
  waits: WaitLine[];
  /** Every check of the units in work, for choosing. */
  checks: CheckName[];
  /** Hold points that stand: what comes after them waits without being listed here. */
  holdPoints: number;
  drawing: { width: number; height: number; boxes: CheckBox[]; lines: PlacedLine[] };
};
