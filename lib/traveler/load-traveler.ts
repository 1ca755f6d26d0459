import { database } from "@/db/client";
import { findUnitWithTraveler } from "@/db/queries/travelers";
import type { ProjectScope } from "@/lib/access/scope";
import { buildCheckViews } from "./build-check-views";
import { loadHistory } from "./load-history";
import type { LoadedTraveler } from "./traveler-view";

/** One unit with its traveler and the whole history of every check, in eleven queries whatever the size. */
export async function loadTraveler(scope: ProjectScope, serial: string): Promise<LoadedTraveler> {
  const db = database();
  const found = await findUnitWithTraveler(db, scope.projectId, serial);
  if (!found) return { kind: "missing" };
  const { unit, board, revision, position, label, procedureId, number, newest, reworks, faults } = found;
  const head = {
    unit: {
      id: unit.id,
      serial: unit.serial,
      note: unit.note,
      archived: unit.archivedAt !== null,
      version: unit.version,
    },
    board,
    revision,
    reworks,
    faults,
    slot: position === null ? null : { position, label: label ?? "" },
  };
  if (procedureId === null || number === null) return { kind: "none", unit: { ...head, newestNumber: newest } };
  const { live, retired } = buildCheckViews(unit.serial, await loadHistory(db, scope.projectId, unit.id));
  const procedure = { id: procedureId, number, newestNumber: newest ?? number };
  return { kind: "traveler", traveler: { ...head, procedure, checks: live, retired } };
}
