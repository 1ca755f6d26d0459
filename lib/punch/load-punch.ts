import { database } from "@/db/client";
import { findPunchItems, type PunchRow } from "@/db/queries/punch";
import type { PunchSource } from "@/db/schema/faults";
import type { ProjectScope } from "@/lib/access/scope";

export type PunchItemView = {
  id: string;
  source: PunchSource;
  /** "F3", "R2"; empty for a concession and for what is gone. */
  mark: string;
  serial: string | null;
  text: string;
  /** How it was dealt with; empty while it is open. */
  dealtWith: string;
  dealt: { by: string; at: string } | null;
  version: number;
  fault: number | null;
  rework: number | null;
};

/** The punch lists of a board, by the id of the revision that took them. */
export async function loadPunch(scope: ProjectScope, boardId: string): Promise<Record<string, PunchItemView[]>> {
  const lists: Record<string, PunchItemView[]> = {};
  for (const row of await findPunchItems(database(), scope, boardId)) {
    (lists[row.item.revisionId] ??= []).push(view(row));
  }
  return lists;
}

function view({ item, serial, dealtByName, faultNumber, reworkNumber }: PunchRow): PunchItemView {
  const { id, source, text, dealtWith, dealtAt, version } = item;
  return {
    ...{ id, source, serial, text, dealtWith, version, fault: faultNumber, rework: reworkNumber },
    mark: faultNumber !== null ? `F${faultNumber}` : reworkNumber !== null ? `R${reworkNumber}` : "",
    dealt: dealtAt ? { by: dealtByName ?? "Somebody who left", at: dealtAt.toISOString() } : null,
  };
}
