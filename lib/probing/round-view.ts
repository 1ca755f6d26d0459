import type { ConnectorGrid } from "@/lib/calc/connector";
import type { Place } from "@/lib/calc/netlist";

/** One end of a probe. `net` is empty for a pad that belongs to none. */
export type RoundPoint = { name: string; net: string; xMm: number | null; yMm: number | null };

/** Places in `points`, and what it should say. Its number is its place in the list. */
export type RoundProbe = {
  a: number;
  b: number;
  expect: "joined" | "apart";
  kind: "continuity" | "isolation" | "follow-up";
};

export type SaidResult = {
  id: string;
  probe: number;
  beeps: boolean | null;
  ohm: number | null;
  typed: string;
  by: string | null;
  at: string;
};

export type BoardDrawing = { outline: Place[][]; places: "board" | "faces" | "none" };

/** What was planned, in figures; kept with the round. */
export type PlanFigures = {
  counts: { nets: number; points: number; continuity: number; isolation: number };
  everyPair: number;
  saved: number;
  travelMm: number | null;
  caution: string | null;
  remarks: string[];
};

export type RoundLimits = { joinedOhm: number; apartOhm: number; words: string };

export type RoundView = {
  id: string;
  unit: { serial: string; archived: boolean };
  board: { code: string; name: string };
  netlist: { letter: string; number: number };
  about: string;
  populated: boolean;
  limits: RoundLimits;
  figures: PlanFigures;
  points: RoundPoint[];
  probes: RoundProbe[];
  drawing: BoardDrawing;
  /** Connectors of the board, to light a pin whose place is not known. */
  faces: { reference: string; type: string; grid: ConnectorGrid | null }[];
  results: SaidResult[];
  checkId: string | null;
  attemptId: string | null;
  startedAt: string;
  closedAt: string | null;
};
