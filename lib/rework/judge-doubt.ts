import type { CoveringRow, ReworkUnit } from "@/db/queries/reworks";
import type { ReworkKind } from "@/db/schema/faults";
import { parsePin } from "@/lib/calc/connector";
import { doubtfulAfter, type DoubtAfter, type ReworkKind as CalcKind } from "@/lib/calc/doubt";
import type { Paces } from "@/lib/calc/forecast";
import type { DoubtGround } from "./doubt-context";
import type { PreviewReworkInput, Touches } from "./schema";

const KINDS: Record<ReworkKind, CalcKind> = {
  "bodge-wire": "bodge wire",
  "cut-track": "cut track",
  "part-swap": "part swap",
  reflow: "reflow",
  firmware: "firmware",
  connector: "crimp",
};

export type Judged = DoubtAfter & { byId: Map<string, CoveringRow> };

type Given = Pick<PreviewReworkInput, "kind" | "wire" | "touches" | "added" | "spared">;

/** What the rework does to every check of the unit, of what depends on it and of its neighbours in the machine. */
export function judgeDoubt(
  unit: ReworkUnit,
  { rows, maps, neighbours }: DoubtGround,
  { kind, wire, touches, added, spared }: Given,
  paces?: Paces,
): Judged {
  const after = doubtfulAfter(
    {
      unitId: unit.id,
      board: unit.board.code,
      kind: KINDS[kind],
      touches: withWireEnds(touches, wire),
      neighbours,
    },
    rows.map(({ unit_id: unitId, hold_point: holdPoint, ...row }) => ({ ...row, unitId, holdPoint })),
    { maps, choices: { added, spared }, ...(paces ? { paces } : {}) },
  );
  return { ...after, byId: new Map(rows.map((row) => [row.id, row])) };
}

/** A wire touches the two pins that it joins. An end that is no pin ("the via beside C4") touches what else is named. */
export function withWireEnds(touches: Touches, wire: { from: string; to: string } | null): Touches {
  const ends = wire ? [wire.from, wire.to].map((end) => end.trim()).filter((end) => parsePin(end)) : [];
  return { ...touches, pins: [...new Set([...touches.pins, ...ends])] };
}
