import { database } from "@/db/client";
import { findContinuityChecks, findProbedUnit } from "@/db/queries/probing";
import type { ProjectScope } from "@/lib/access/scope";
import type { ContinuityReport } from "@/lib/calc/continuity";
import { loadRound } from "./load-round";
import { reportRound } from "./report-round";
import type { RoundView } from "./round-view";
import { provesUnit, sumUp } from "./sum-up";

export type RoundPage = {
  round: RoundView;
  report: ContinuityReport;
  /** Probes that the answers call for and that are not in the round yet. */
  followUps: number;
  said: string;
  conforms: boolean;
  checks: { id: string; title: string }[];
};

export async function loadRoundPage(scope: ProjectScope, id: string): Promise<RoundPage | undefined> {
  const db = database();
  const round = await loadRound(scope, id);
  if (!round) return undefined;
  const [reported, unit] = await Promise.all([
    reportRound(db, scope, round.id),
    findProbedUnit(db, scope, round.unit.serial),
  ]);
  if (!reported || !unit) return undefined;
  const { report, followUps } = reported;
  const checks = await findContinuityChecks(db, scope, unit.id);
  return {
    ...{ round, report, followUps },
    said: sumUp(report),
    conforms: provesUnit(report),
    checks: checks.map(({ id: checkId, title }) => ({ id: checkId, title })),
  };
}
