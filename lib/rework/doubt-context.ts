import type { Queryable } from "@/db/client";
import { findSignals } from "@/db/queries/machine";
import {
  findCopper,
  findCoveringChecks,
  findNamedPins,
  findPlacedUnits,
  type CopperPoint,
  type CoveringRow,
  type ReworkUnit,
} from "@/db/queries/reworks";
import { parsePin } from "@/lib/calc/connector";
import type { BoardMap } from "@/lib/calc/doubt";
import { signalKey } from "@/lib/calc/signal-names";
import { groupBy } from "@/lib/traveler/group-by";
import type { Touches } from "./schema";

export type DoubtGround = { rows: CoveringRow[]; maps: BoardMap[]; neighbours: string[] };

/** Units that sit in the machine together with this one; none while it lies on the bench. */
export async function findNeighbours(db: Queryable, scope: InProject, unit: ReworkUnit): Promise<string[]> {
  if (!unit.isPlaced) return [];
  return (await findPlacedUnits(db, scope)).filter((id) => id !== unit.id);
}

type InProject = { projectId: string };

/** Nothing that a rework names has more pins on one board. */
const MOST_POINTS = 20_000;

/** All that decides which checks a rework of the unit puts in doubt. Four queries whatever the size of the machine. */
export async function loadDoubtGround(
  db: Queryable,
  scope: InProject,
  unit: ReworkUnit,
  { neighbours, touches }: { neighbours: string[]; touches: Touches },
): Promise<DoubtGround> {
  const rows = await findCoveringChecks(db, scope, [unit.id, ...neighbours]);
  const codes = [...new Set([unit.board.code, ...rows.map(({ board }) => board)])];
  const covered = rows.flatMap(({ unit_id, covers }) => (unit_id === unit.id ? covers.pins : []));
  const parts = [
    ...new Set([
      ...touches.parts.map((part) => part.trim().toUpperCase()),
      ...[...touches.pins, ...covered].flatMap((pin) => parsePin(pin)?.connector ?? []),
    ]),
  ];
  const [pins, signals, copper] = await Promise.all([
    findNamedPins(db, scope, codes),
    findSignals(db, scope),
    findCopper(db, scope, unit.revision.id, { parts, limit: MOST_POINTS }),
  ]);
  const grounds = new Set([
    ...pins.filter(({ role }) => role === "ground").map(({ signal }) => signalKey(signal)),
    ...signals.filter((signal) => signal.class === "ground").map(({ name }) => signalKey(name)),
    signalKey("GND"),
  ]);
  // Ground hangs on nearly every part, and no part interrupts it; a ground pin that is named itself stands for it.
  const named = new Set(touches.pins.map(pinKey));
  const joined = copper.filter(
    ({ part, pin, net }) => !grounds.has(signalKey(net)) || named.has(pinKey(`${part} ${pin}`)),
  );
  const aliases = signals.map(({ name, aliases }) => ({ name, aliases }));
  const maps = codes.map((board): BoardMap => ({
    board,
    pins: [
      ...pins.filter((pin) => pin.board === board),
      ...(board === unit.board.code ? joined : []).map(({ part, pin, net }) => ({ connector: part, pin, signal: net })),
    ],
    parts: board === unit.board.code ? partsOf(joined) : [],
    aliases,
  }));
  return { rows, maps, neighbours };
}

function partsOf(copper: readonly CopperPoint[]): BoardMap["parts"] {
  return [...groupBy(copper, ({ part }) => part)].map(([part, points]) => ({
    part,
    signals: [...new Set(points.map(({ net }) => net))],
    blocks: [],
  }));
}

function pinKey(text: string): string {
  const pin = parsePin(text);
  return pin ? `${pin.connector ?? ""} ${pin.pin}` : "";
}
