import type { Queryable } from "@/db/client";
import { findBoardOrders, findBoardsToOrder, findProvenSerials } from "@/db/queries/order";
import type { BoardOrderInput } from "@/lib/calc/sequence";
import { readMachine } from "@/lib/machine/load-machine";
import { overrideOf } from "./overrides";

type InProject = { projectId: string };

/** All that the order of the boards rests upon, as it stands in the database. */
export async function readBoardOrder(db: Queryable, scope: InProject) {
  const [{ machine, rails }, said, boards, serials] = await Promise.all([
    readMachine(db, scope),
    findBoardOrders(db, scope),
    findBoardsToOrder(db, scope),
    findProvenSerials(db, scope),
  ]);
  const proven = new Set(serials);
  const codes = new Map(boards.map(({ id, code }) => [id, code]));
  const input: BoardOrderInput = {
    machine,
    // A placement carries the serial of the unit that stands there.
    proofs: machine.placements.map(({ id, label }) => ({ placement: id, proven: proven.has(label) })),
    railSources: rails.flatMap(({ name, sourceBoardId }) => {
      const board = codes.get(sourceBoardId ?? "");
      return board === undefined ? [] : [{ rail: name, board }];
    }),
    overrides: said.map(overrideOf),
  };
  return { input, said, boards };
}
