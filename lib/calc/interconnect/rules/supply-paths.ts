import type { IndexedPin } from "../index-design";
import type { PlacedBoard } from "../index-machine";
import type { PinRole } from "../machine";
import { byName } from "../order";
import type { Survey } from "../survey";

/** What a board draws through which of its pins; ground carries the sum of all rails back. */
export type SupplyPath = { placed: PlacedBoard; rail: string; role: PinRole; worstA: number };

/** The worst draw of each design from each rail, and of all rails together for ground. */
export function supplyPaths({ index }: Survey): SupplyPath[] {
  const byPlacement = new Map(index.placed.map((placed) => [placed.placement.id, placed]));
  const worst = new Map<string, SupplyPath>();
  const keep = (path: SupplyPath) => {
    const key = `${path.placed.board.design.code}\u0000${path.rail}\u0000${path.role}`;
    const known = worst.get(key);
    if (!known || Math.abs(known.worstA) < Math.abs(path.worstA)) worst.set(key, path);
  };
  const sums = new Map<PlacedBoard, Map<string, number>>();
  for (const { placement, rail, worstA } of index.machine.draws) {
    const placed = byPlacement.get(placement);
    if (!placed || !Number.isFinite(worstA)) continue;
    const rails = sums.get(placed) ?? new Map<string, number>();
    sums.set(placed, rails.set(rail, (rails.get(rail) ?? 0) + worstA));
  }
  for (const [placed, rails] of sums) {
    for (const [rail, worstA] of rails) keep({ placed, rail, role: "power", worstA });
    const back = [...rails.values()].reduce((sum, worstA) => sum + Math.abs(worstA), 0);
    keep({ placed, rail: "", role: "ground", worstA: back });
  }
  return [...worst.entries()].sort(([a], [b]) => byName(a, b)).map(([, path]) => path);
}

export const matedConnectors = (survey: Survey, { board }: PlacedBoard) =>
  board.connectors.filter((connector) => survey.partnersOf(connector).length > 0);

export const isOfPath = ({ areAliases }: Survey, { rail, role }: SupplyPath, pin: IndexedPin) =>
  pin.design.role === role && (role === "ground" || areAliases(pin.signal, rail));

export const supplyPins = (survey: Survey, path: SupplyPath): IndexedPin[] =>
  matedConnectors(survey, path.placed).flatMap((connector) =>
    connector.pins.filter((pin) => isOfPath(survey, path, pin)),
  );
