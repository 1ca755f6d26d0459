import { database } from "@/db/client";
import { findBenchUnits } from "@/db/queries/bench-units";
import type { Stage } from "@/db/schema/procedures";
import type { CheckState } from "@/db/schema/travelers";
import type { ProjectScope } from "@/lib/access/scope";
import { loadNextChecks } from "@/lib/check/load-next-checks";
import type { NextCheck } from "@/lib/check/next-checks";

export type BenchUnit = {
  serial: string;
  board: string;
  letter: string;
  slot: number | null;
  checks: { stage: Stage; state: CheckState }[];
  /** What the bench should do next on this unit; undefined when everything holds or waits. */
  next: NextCheck | undefined;
};

export type BenchView = { next: NextCheck[]; units: BenchUnit[] };

const NEXT_SHOWN = 5;

/** What waits on each unit, and what to do next, in two queries. */
export async function loadBench(scope: ProjectScope): Promise<BenchView> {
  const db = database();
  const [rows, next] = await Promise.all([findBenchUnits(db, scope.projectId), loadNextChecks(db, scope)]);
  const units = new Map<string, BenchUnit>();
  for (const row of rows) {
    const unit = units.get(row.serial) ?? {
      serial: row.serial,
      board: row.board,
      letter: row.letter,
      slot: row.slot,
      checks: [],
      next: next.find((check) => check.serial === row.serial),
    };
    if (row.stage && row.state) unit.checks.push({ stage: row.stage, state: row.state });
    units.set(row.serial, unit);
  }
  return { next: next.slice(0, NEXT_SHOWN), units: [...units.values()] };
}
