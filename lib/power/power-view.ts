import type { BoardPower, CurrentWindow, MachinePower } from "@/lib/calc/power";
import type { Conditions } from "@/lib/plan-conditions/schema";
import type { RailNow } from "@/lib/rail/schema";
import type { CopperLoad } from "./copper-load";
import type { PlannedLine } from "./plan-power";

export type BoardView = {
  code: string;
  name: string;
  /** Where it stands: "CON-01", "CON in slot 7". */
  units: string[];
  lines: PlannedLine[];
  /** On the bench, alone; null: nothing is known, or `problem` says why it cannot be added up. */
  power: BoardPower | null;
  /** For its first power, a rail each. */
  windows: CurrentWindow[];
  notes: string[];
  problem: string | null;
};

export type RailView = {
  name: string;
  volts: number;
  tolerancePercent: number;
  capacityA: number | null;
  /** Null: nobody has described it; the conditions name it. */
  kept: RailNow | null;
  /** Code of the board that feeds it. */
  source: string | null;
  /** Where it enters the backplane; 0: before slot 1. Null without copper, when no drop is worked out. */
  sourceSlot: number | null;
};

export type PowerView = {
  conditions: Conditions;
  rails: RailView[];
  boards: BoardView[];
  /** Of the assembled machine; a sentence where it cannot be worked out. */
  machine: { ok: true; value: MachinePower } | { ok: false; message: string };
  /** Of rails whose copper is known, by name. */
  copper: Record<string, CopperLoad>;
  slots: { position: number; label: string }[];
  /** Boards that can feed a rail. */
  sources: { id: string; code: string; name: string }[];
};
