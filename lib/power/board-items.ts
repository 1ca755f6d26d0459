import { findFamily } from "@/lib/calc/levels";
import { findPart, partFor, type LogicPart } from "@/lib/calc/logic-parts";
import { packageItem, type PowerItem } from "@/lib/calc/power";
import type { Designs } from "@/lib/board-plan/load-designs";
import { familyOf, packBoard, planOf } from "@/lib/board-plan/pack-board";

type BomRow = { boardId: string; partNumber: string; count: number };
type Found = { items: PowerItem[]; notes: string[] };

/** The logic of a board as items: the packages of its blocks, and those of its further parts that are logic. */
export function boardItems(designs: Designs, bom: readonly BomRow[], boardId: string, rail: string): Found {
  const { clockHz, activity, loadPf, family } = planOf(designs, boardId);
  const plan = { rail, clockHz, activity, loadPf };
  const notes: string[] = [];
  const items: PowerItem[] = [];
  if (designs.uses.some((use) => use.boardId === boardId)) {
    const packed = packBoard(designs, boardId);
    if (!packed.ok)
      notes.push(`Its packages are left out: ${packed.problems[0]?.message ?? "they cannot be counted."}`);
    for (const { gateFunction, count, gatesUsed } of packed.ok ? packed.packing.lines : []) {
      const part = partFor(gateFunction, designs.own);
      if (part) items.push(packageItem(part, count, gatesUsed, { ...plan, family: familyOf(designs, family) }));
    }
  }
  for (const { partNumber, count } of bom.filter((row) => row.boardId === boardId)) {
    const logic = logicOf(designs, partNumber, family);
    if (!logic) continue;
    const gatesUsed = count * logic.part.gatesPerPackage;
    items.push(packageItem(logic.part, count, gatesUsed, { ...plan, family: familyOf(designs, logic.family) }));
  }
  return { items, notes };
}

/** A line of the parts list that is a logic part: one of the project's own, or 74HC283 and its like. */
function logicOf(
  { own, families }: Designs,
  partNumber: string,
  family: string,
): { part: LogicPart; family: string } | undefined {
  const mine = own.find(({ number }) => number.toLowerCase() === partNumber.trim().toLowerCase());
  if (mine) return { part: mine, family: Object.hasOwn(mine.perFamily, family) ? family : firstOf(mine, family) };
  const [, letters, digits] = /^[A-Z]{0,3}74([A-Z]{1,5})(\d{2,4})(?!\d)/i.exec(partNumber.trim()) ?? [];
  const named = letters === undefined ? undefined : findFamily(families, letters);
  const part = digits === undefined ? undefined : findPart(digits);
  return part && named ? { part, family: named.name } : undefined;
}

const firstOf = ({ perFamily }: LogicPart, otherwise: string): string => Object.keys(perFamily)[0] ?? otherwise;
