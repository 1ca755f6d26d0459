import { database } from "@/db/client";
import {
  findBoardsWithUnits,
  findHappenedSince,
  findRackChecks,
  findSlotsOfProject,
  type RackCheck,
} from "@/db/queries/rack";
import type { ProjectScope } from "@/lib/access/scope";
import { nextChecks } from "@/lib/check/next-checks";
import { forecastWork } from "@/lib/forecast/forecast-work";
import { sayForecast } from "@/lib/forecast/say-forecast";
import { buildUnit } from "./build-unit";
import type { RackBoard, RackUnit, RackView, SinceView } from "./rack-view";

/** How many steps the panel beside the rack lists. */
const STEPS = 5;

/** The whole first screen of a project in four queries, whatever its size. */
export async function loadRack(scope: ProjectScope): Promise<RackView> {
  const db = database();
  const [slotRows, boardRows, checkRows, happened] = await Promise.all([
    findSlotsOfProject(db, scope),
    findBoardsWithUnits(db, scope),
    findRackChecks(db, scope),
    findHappenedSince(db, scope),
  ]);
  const next = nextChecks(checkRows).slice(0, STEPS);
  const nextIds = next.map((step) => step.checkId);
  const boards = new Map<string, RackBoard>(boardRows.map(({ board }) => [board.id, board]));
  const checksOf = new Map<string, RackCheck[]>();
  for (const check of checkRows) {
    const list = checksOf.get(check.unitId);
    if (list) list.push(check);
    else checksOf.set(check.unitId, [check]);
  }
  const units = new Map<string, RackUnit>();
  for (const { board, unitId, serial, revision } of boardRows) {
    if (unitId === null || serial === null) continue;
    const row = { id: unitId, serial, revision: revision ?? "", board };
    units.set(unitId, buildUnit(row, checksOf.get(unitId) ?? [], nextIds));
  }
  const slots = slotRows.flatMap((row) =>
    row.slotId === null || row.position === null
      ? []
      : [
          {
            id: row.slotId,
            position: row.position,
            label: row.label ?? "",
            pitchHp: row.pitchHp ?? 4,
            board: row.boardId === null ? null : (boards.get(row.boardId) ?? null),
            unit: row.unitId === null ? null : (units.get(row.unitId) ?? null),
          },
        ],
  );
  const seated = new Set(slots.map((slot) => slot.unit?.id));
  const all = [...units.values()];
  const backplaneBoard = [...boards.values()].find((board) => board.kind === "backplane");
  const backplaneUnit = all.find((unit) => unit.board.id === backplaneBoard?.id) ?? null;
  const sum = (pick: (unit: RackUnit) => number) => all.reduce((total, unit) => total + pick(unit), 0);
  const project = slotRows[0];
  const [total, holding] = [sum((unit) => unit.total), sum((unit) => unit.holding)];
  const { history } = happened;
  const found = forecastWork({ projectId: scope.projectId, history, remaining: total - holding, now: new Date() });
  return {
    name: project?.name ?? scope.projectName,
    summary: project?.summary ?? "",
    layout: project?.layout ?? "tower",
    slots,
    backplane: backplaneBoard ? { board: backplaneBoard, unit: backplaneUnit } : null,
    loose: all.filter((unit) => !seated.has(unit.id) && unit !== backplaneUnit),
    boards: [...boards.values()],
    next,
    since: sinceView(happened),
    outlook: total === 0 ? null : sayForecast(found, scope.viewer.timeZone),
    toMend: project?.toMend ?? 0,
    total,
    holding,
    failing: sum((unit) => unit.failing),
    doubtful: sum((unit) => unit.doubtful),
    reopened: sum((unit) => unit.reopened),
  };
}

function sinceView(row: Awaited<ReturnType<typeof findHappenedSince>>): SinceView {
  return {
    at: row.at,
    from: row.from_digest ? "digest" : "sunday",
    attempts: row.attempts,
    evenings: row.evenings,
    firstPasses: row.first_passes,
    repeats: row.attempts - row.first_passes - row.failures,
    failures: row.failures,
    photos: row.photos,
    captures: row.captures,
  };
}
