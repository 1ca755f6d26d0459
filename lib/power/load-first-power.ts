import { database } from "@/db/client";
import { findConditions, findRails } from "@/db/queries/machine";
import { findBomLines } from "@/db/queries/parts";
import { findPowerLines } from "@/db/queries/power";
import type { ProjectScope } from "@/lib/access/scope";
import { loadDesigns } from "@/lib/board-plan/load-designs";
import { currentWindows, type CurrentWindow } from "@/lib/calc/power";
import { loadOfferPlaces } from "@/lib/offer/load-offer-places";
import type { OfferPlace } from "@/lib/offer/schema";
import { planPower } from "./plan-power";

export type FirstPowerView = { windows: CurrentWindow[]; place: OfferPlace };

/** Checks that a supply's current can be judged by. */
export const CURRENT_CHECKS = { stage: "power-on", kind: "reading", typed: { unit: "A" } } as const;

/** What one unit of the board should draw on the bench, and the checks that it is offered to; undefined: not known. */
export async function loadFirstPower(scope: ProjectScope, code: string): Promise<FirstPowerView | undefined> {
  const db = database();
  const board = code.toUpperCase();
  const [designs, lines, bom, rails, conditions, places] = await Promise.all([
    loadDesigns(db, scope),
    findPowerLines(db, scope),
    findBomLines(db, scope),
    findRails(db, scope),
    findConditions(db, scope),
    loadOfferPlaces(scope, { ...CURRENT_CHECKS, board }),
  ]);
  const plan = planPower({ designs, lines, bom, rails, conditions, placed: [] });
  const power = plan.boards.find((one) => one.code === board)?.alone;
  const windows = power ? currentWindows(power) : [];
  const [place] = places;
  return place && windows.length > 0 ? { windows, place } : undefined;
}
