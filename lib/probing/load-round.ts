import { database } from "@/db/client";
import { findMachineConnectors } from "@/db/queries/machine";
import { findResults, findRound } from "@/db/queries/probing";
import type { ProjectScope } from "@/lib/access/scope";
import { storedNetlist } from "@/lib/netlist/stored-netlist";
import { aboutRound, roundLimits } from "./plan-round";
import { pointsOf, shownProbes } from "./round-points";
import type { RoundView } from "./round-view";
import { saidResult } from "./said-result";
import { storedOptions, storedProbes } from "./stored-plan";

const UUID = /^[0-9a-f]{8}(-[0-9a-f]{4}){3}-[0-9a-f]{12}$/i;

export async function loadRound(scope: ProjectScope, id: string): Promise<RoundView | undefined> {
  if (!UUID.test(id)) return undefined;
  const db = database();
  const found = await findRound(db, scope, id);
  if (!found) return undefined;
  const { plan, unit, board, netlist, letter } = found;
  const { asked, figures } = storedOptions(plan.options);
  const content = storedNetlist(netlist.content);
  const [said, connectors] = await Promise.all([findResults(db, plan.id), findMachineConnectors(db, scope)]);
  return {
    id: plan.id,
    unit: { serial: unit.serial, archived: unit.archivedAt !== null },
    board: { code: board.code, name: board.name },
    netlist: { letter, number: netlist.number },
    about: aboutRound(asked),
    populated: asked.populated,
    limits: roundLimits(asked),
    figures,
    ...shownProbes(pointsOf(content), storedProbes(plan.probes)),
    drawing: {
      outline: content.outlines.filter(({ kind }) => kind === "board").flatMap(({ paths }) => paths),
      places: content.places,
    },
    faces: connectors
      .filter(({ boardId }) => boardId === board.id)
      .map(({ reference, type, grid }) => ({ reference, type, grid })),
    results: said.map(saidResult),
    checkId: plan.checkId,
    attemptId: plan.attemptId,
    startedAt: plan.createdAt.toISOString(),
    closedAt: plan.closedAt?.toISOString() ?? null,
  };
}
