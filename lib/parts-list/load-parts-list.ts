import { database } from "@/db/client";
import { findBuiltUnits } from "@/db/queries/blocks";
import { findConditions } from "@/db/queries/machine";
import { findBomLines } from "@/db/queries/parts";
import type { ProjectScope } from "@/lib/access/scope";
import { boardParts } from "@/lib/board-plan/board-parts";
import { loadDesigns } from "@/lib/board-plan/load-designs";
import { packBoard, planOf } from "@/lib/board-plan/pack-board";
import { listParts, type PartsList, type PartsListLine } from "@/lib/calc/parts-list";
import { priceText } from "@/lib/part/price";
import { LEAST_SPARES } from "./schema";

export type OrderLine = PartsListLine & {
  /** Price of one as typed; empty: not known. */
  priceTyped: string;
  /** Of the row that keeps its stock and price; 0 while there is none. */
  version: number;
};

export type PartsListView = {
  boards: { code: string; name: string; units: number; isPlanned: boolean }[];
  /** The board whose parts alone are listed; null: the whole machine. */
  board: string | null;
  lines: OrderLine[];
  totals: PartsList["totals"];
  /** Boards whose packages could not be counted, and what else keeps the list from being whole. */
  problems: string[];
  currency: string;
  spares: { percent: number; minimum: number; version: number };
};

/** What to order for all units of all boards, or of one. */
export async function loadPartsList(scope: ProjectScope, board: string | null): Promise<PartsListView> {
  const db = database();
  const [designs, units, bom, conditions] = await Promise.all([
    loadDesigns(db, scope),
    findBuiltUnits(db, scope),
    findBomLines(db, scope),
    findConditions(db, scope),
  ]);
  const problems: string[] = [];
  const boards = designs.boards.map(({ id, code, name }) => {
    const { unitsPlanned } = planOf(designs, id);
    const packed = packBoard(designs, id);
    if (!packed.ok) problems.push(`${code}: ${packed.problems[0]?.message ?? "its packages cannot be counted."}`);
    const own = bom.filter(({ boardId }) => boardId === id);
    return {
      ...{ code, name },
      units: unitsPlanned ?? units.filter(({ boardId }) => boardId === id).length,
      isPlanned: unitsPlanned !== null,
      lines: boardParts(packed.ok ? packed.packing : null, own),
    };
  });
  const wanted = boards.find(({ code }) => code === board?.toUpperCase())?.code ?? null;
  const rows = new Map(designs.parts.map((part) => [part.number, part]));
  // The column keeps about seven digits: 12.3 comes back as 12.300000190734863.
  const spares = { percent: Number(conditions.sparesPercent.toPrecision(6)), minimum: LEAST_SPARES };
  const result = listParts({
    boards: boards.filter(({ code }) => wanted === null || code === wanted),
    spares,
    known: Object.fromEntries(
      designs.parts.map(({ number, stock, priceCents }) => {
        return [number, { stock, price: priceCents === null ? null : { minor: priceCents, pieces: 1 } }];
      }),
    ),
  });
  if (!result.ok) problems.push(...result.problems.map(({ message }) => message));
  const list = result.ok ? result.list : EMPTY;
  return {
    boards: boards.map(({ code, name, units: count, isPlanned }) => ({ code, name, units: count, isPlanned })),
    board: wanted,
    lines: list.lines.map((line) => {
      const row = rows.get(line.part);
      const description = line.description || (row?.description ?? "");
      return { ...line, description, priceTyped: priceText(row?.priceCents ?? null), version: row?.version ?? 0 };
    }),
    totals: list.totals,
    problems,
    currency: conditions.currency,
    spares: { ...spares, version: conditions.version },
  };
}

const EMPTY: PartsList = { lines: [], totals: { parts: 0, needed: 0, toBuy: 0, costMinor: 0, withoutPrice: [] } };
