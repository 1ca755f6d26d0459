import { database } from "@/db/client";
import { findBoardsInWork } from "@/db/queries/blocks";
import { findDelayPaths } from "@/db/queries/delay-paths";
import { findConditions, findOwnFamilies } from "@/db/queries/machine";
import { findParts } from "@/db/queries/parts";
import type { ProjectScope } from "@/lib/access/scope";
import type { Family } from "@/lib/calc/levels";
import type { LogicPart } from "@/lib/calc/logic-parts";
import { familiesOf } from "@/lib/family/families-of";
import { loadOfferPlaces } from "@/lib/offer/load-offer-places";
import type { OfferPlace } from "@/lib/offer/schema";
import { ownLogic } from "@/lib/part/own-logic";
import { pathShape, type StoredPath } from "./path-shape";
import type { TypedPath } from "./schema";
import { typePath } from "./type-path";

export type DelayPathLine = {
  id: string;
  name: string;
  /** Code of its board; empty: none. */
  board: string;
  path: StoredPath;
  typed: TypedPath;
  version: number;
  archived: boolean;
};

export type DelayView = {
  paths: DelayPathLine[];
  boards: { code: string; name: string }[];
  own: LogicPart[];
  families: Family[];
  /** Supply of the logic, V. */
  logicVolts: number;
  /** Procedures into whose capture checks a window may go. */
  places: OfferPlace[];
};

export async function loadDelayPaths(scope: ProjectScope): Promise<DelayView> {
  const db = database();
  const [rows, boards, parts, families, conditions, places] = await Promise.all([
    findDelayPaths(db, scope),
    findBoardsInWork(db, scope),
    findParts(db, scope),
    findOwnFamilies(db, scope),
    findConditions(db, scope),
    loadOfferPlaces(scope, { kind: "capture" }),
  ]);
  return {
    paths: rows.map(({ path: row, board }): DelayPathLine => {
      const path = pathShape.parse(row.path);
      const { id, name, version } = row;
      return {
        ...{ id, name, version, path },
        board: board ?? "",
        typed: typePath(path),
        archived: row.archivedAt !== null,
      };
    }),
    boards: boards.map(({ code, name }) => ({ code, name })),
    own: ownLogic(parts),
    families: familiesOf(families),
    logicVolts: conditions.logicVolts,
    places,
  };
}
