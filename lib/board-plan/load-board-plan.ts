import { database } from "@/db/client";
import { findBuiltUnits } from "@/db/queries/blocks";
import { findBomLines } from "@/db/queries/parts";
import type { ProjectScope } from "@/lib/access/scope";
import { outdatedUnits, type OutdatedUnit } from "@/lib/block/outdated-units";
import type { LogicPart } from "@/lib/calc/logic-parts";
import { choosePackages, type BlockDesign } from "@/lib/calc/packing";
import { formatQuantity, type Unit } from "@/lib/calc/units";
import { loadOfferPlaces } from "@/lib/offer/load-offer-places";
import type { OfferPlace } from "@/lib/offer/schema";
import { loadDesigns } from "./load-designs";
import { blockDesigns, planOf } from "./pack-board";
import type { SaveBoardPlanTyped, SaveBomTyped } from "./schema";

type Choice = { id: string; label: string; description: string };

export type BoardPlanView = {
  board: { code: string; name: string };
  /** Serials of the units that are there. */
  units: string[];
  /** As its forms show it. */
  plan: Omit<SaveBoardPlanTyped, "project" | "writeId" | "board" | "version">;
  lines: SaveBomTyped["lines"];
  version: number;
  sparesTied: boolean;
  /** What packing takes, so that it can be counted as one types. */
  designs: BlockDesign[];
  packages: Record<string, LogicPart>;
  families: { name: string; technology: "CMOS" | "bipolar"; description: string }[];
  /** Blocks that the board may use. */
  choices: Choice[];
  outdated: OutdatedUnit[];
  /** Where the ties may become a check; undefined while the board has no procedure. */
  place: OfferPlace | undefined;
};

export async function loadBoardPlan(scope: ProjectScope, code: string): Promise<BoardPlanView | undefined> {
  const db = database();
  const [designs, units, bom] = await Promise.all([
    loadDesigns(db, scope),
    findBuiltUnits(db, scope),
    findBomLines(db, scope),
  ]);
  const board = designs.boards.find((one) => one.code === code.toUpperCase());
  if (!board) return undefined;
  const places = await loadOfferPlaces(scope, { stage: "inspection", kind: "statement", board: board.code });
  const { blocks, holdings, uses } = designs;
  const plan = planOf(designs, board.id);
  const own = uses.filter(({ boardId }) => boardId === board.id);
  const packing = blockDesigns(designs);
  return {
    board: { code: board.code, name: board.name },
    units: units.filter(({ boardId }) => boardId === board.id).map(({ serial }) => serial),
    plan: {
      packing: plan.packing,
      family: plan.family,
      clockHz: write(plan.clockHz, "Hz"),
      activity: write(plan.activity * 100, "%"),
      loadPf: write(plan.loadPf / 1e12, "F"),
      unitsPlanned: plan.unitsPlanned === null ? "" : String(plan.unitsPlanned),
      blocks: own.map(({ blockId, count }) => ({ block: blockId, count: String(count) })),
    },
    lines: bom
      .filter(({ boardId }) => boardId === board.id)
      .map(({ partNumber, description, count, designators }) => {
        return { partNumber, description, count: String(count), designators };
      }),
    version: plan.version,
    sparesTied: plan.sparesTied,
    designs: packing,
    packages: choosePackages(packing, [], designs.own),
    families: designs.families.map(({ name, technology }) => ({ name, technology, description: technology })),
    choices: blocks
      .filter(({ id, archivedAt }) => !archivedAt || own.some(({ blockId }) => blockId === id))
      .map(({ id, name, summary }) => ({ id, label: name, description: summary })),
    outdated: outdatedUnits({ blocks, holdings, uses, units }).filter(({ boardId }) => boardId === board.id),
    place: places[0],
  };
}

/** real columns keep about seven digits; more would be noise. */
const write = (value: number, unit: Unit) =>
  formatQuantity({ value: Number(value.toPrecision(6)), unit }).replace("\u202f", " ");
