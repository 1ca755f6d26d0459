import { database } from "@/db/client";
import { findFaults, findFault } from "@/db/queries/faults";
import { findRework, findReworksOfUnits, findReworkUnit, findTouches } from "@/db/queries/reworks";
import type { ReworkKind, TouchKind, Wire } from "@/db/schema/faults";
import type { ProjectScope } from "@/lib/access/scope";
import { loadBoardNames, type BoardNames } from "@/lib/board/load-board-names";
import { nextWire } from "./rework-words";
import type { Touches } from "./schema";

export type FaultChoice = { id: string; number: number; title: string };

export type ReworkForm = {
  unit: { serial: string };
  board: { code: string; name: string };
  revision: string;
  names: BoardNames;
  nextWire: string;
  /** Faults of the unit that stand, and the one that was asked for. */
  faults: FaultChoice[];
  start: {
    kind: ReworkKind;
    what: string;
    why: string;
    wire: Wire | null;
    touches: Touches;
    faultId: string | null;
    /** Carried over from this rework of another unit. */
    carried: { id: string; serial: string; number: number } | null;
  };
};

type Wanted = { serial: string; fault: number | undefined; from: string };

const NOTHING: Touches = { signals: [], pins: [], parts: [], blocks: [], rails: [] };
const UUID = /^[0-9a-f]{8}(-[0-9a-f]{4}){3}-[0-9a-f]{12}$/i;

/** A fresh rework of a unit, begun from a fault, from a rework of another unit, or from nothing. */
export async function loadReworkForm(scope: ProjectScope, wanted: Wanted): Promise<ReworkForm | undefined> {
  const db = database();
  const unit = await findReworkUnit(db, scope, wanted.serial);
  if (!unit || unit.archivedAt) return undefined;
  const [names, own, standing, asked, from] = await Promise.all([
    loadBoardNames(scope, unit.board, unit.revision.id),
    findReworksOfUnits(db, scope, [unit.id]),
    findFaults(db, scope, { states: ["open", "traced"], unit: unit.serial }),
    wanted.fault === undefined ? undefined : findFault(db, scope, wanted.fault),
    UUID.test(wanted.from) ? findRework(db, scope, wanted.from) : undefined,
  ]);
  // A rework of another board makes no sense here.
  const source = from && from.boardId === unit.board.id && from.unitId !== unit.id ? from : undefined;
  const touched = source ? await findTouches(db, [source.id]) : [];
  const of = (kind: TouchKind) => touched.flatMap((touch) => (touch.kind === kind ? [touch.name] : []));
  const fault = asked?.fault;
  const choices = standing.map(({ id, number, title }) => ({ id, number, title }));
  const isListed = !fault || choices.some(({ id }) => id === fault.id);
  return {
    unit: { serial: unit.serial },
    board: { code: unit.board.code, name: unit.board.name },
    revision: unit.revision.letter,
    names,
    nextWire: nextWire(own.flatMap(({ wire }) => (wire ? [wire.number] : []))),
    faults: isListed ? choices : [{ id: fault.id, number: fault.number, title: fault.title }, ...choices],
    start: {
      kind: source?.kind ?? "bodge-wire",
      what: source?.what ?? "",
      why: source?.why ?? fault?.mend ?? "",
      wire: source?.wire ?? null,
      touches: source
        ? { signals: of("signal"), pins: of("pin"), parts: of("part"), blocks: of("block"), rails: of("rail") }
        : { ...NOTHING, signals: fault?.signals ?? [], pins: fault?.pins ?? [] },
      faultId: fault?.id ?? null,
      carried: source ? { id: source.id, serial: source.serial, number: source.number } : null,
    },
  };
}
