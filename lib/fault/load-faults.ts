import { and, asc, eq, isNull } from "drizzle-orm";
import { z } from "zod";
import { database } from "@/db/client";
import { countFaultStates, findFaults } from "@/db/queries/faults";
import { boards, units } from "@/db/schema/boards";
import type { FaultState } from "@/db/schema/faults";
import type { ProjectScope } from "@/lib/access/scope";
import { FAULT_STATES } from "./schema";

/** "standing" are those that are not mended: open and traced. */
export const FAULT_SHOWS = ["standing", ...FAULT_STATES, "all"] as const;
export type FaultShow = (typeof FAULT_SHOWS)[number];

export type FaultQuery = {
  show: FaultShow;
  board: string | undefined;
  unit: string | undefined;
  q: string;
};

const name = z.string().min(1).max(60).optional().catch(undefined);
const search = z.object({
  show: z.enum(FAULT_SHOWS).catch("standing"),
  board: name,
  unit: name,
  q: z.string().trim().max(200).catch(""),
});

/** What the page shows, from the address; what makes no sense there is left out. */
export function faultQuery(given: Record<string, string | string[] | undefined>): FaultQuery {
  const { show, board, unit, q } = search.parse({ ...given, q: given.q ?? "" });
  return { show, board, unit, q: q.replaceAll("\u0000", "") };
}

export type FaultLine = {
  number: number;
  title: string;
  state: FaultState;
  serial: string;
  board: string;
  /** The cause when it is found, else the symptom. */
  says: string;
  signals: string[];
  pins: string[];
  hours: number | null;
  reworks: number;
  by: string;
  at: string;
  closedAt: string | null;
};

export type FaultsView = {
  lines: FaultLine[];
  counts: Record<FaultShow, number>;
  boards: { code: string; name: string }[];
  units: string[];
};

const SHOWN: Record<FaultShow, readonly FaultState[] | undefined> = {
  standing: ["open", "traced"],
  open: ["open"],
  traced: ["traced"],
  mended: ["mended"],
  "no-fault": ["no-fault"],
  all: undefined,
};

export async function loadFaults(scope: ProjectScope, query: FaultQuery): Promise<FaultsView> {
  const db = database();
  const [rows, counted, boardRows, unitRows] = await Promise.all([
    findFaults(db, scope, {
      states: SHOWN[query.show],
      board: query.board,
      unit: query.unit,
      words: query.q === "" ? undefined : query.q,
    }),
    countFaultStates(db, scope),
    db
      .select({ code: boards.code, name: boards.name })
      .from(boards)
      .where(and(eq(boards.projectId, scope.projectId), isNull(boards.archivedAt)))
      .orderBy(asc(boards.code)),
    db
      .select({ serial: units.serial })
      .from(units)
      .where(and(eq(units.projectId, scope.projectId), isNull(units.archivedAt)))
      .orderBy(asc(units.serial)),
  ]);
  const of = (...states: FaultState[]) =>
    counted.reduce((sum, { state, count }) => sum + (states.includes(state) ? count : 0), 0);
  return {
    lines: rows.map((row) => ({
      number: row.number,
      title: row.title,
      state: row.state,
      serial: row.serial,
      board: row.board,
      says: row.cause || row.symptom,
      signals: row.signals,
      pins: row.pins,
      hours: row.hours,
      reworks: row.reworks,
      by: row.byName ?? "Somebody who left",
      at: row.createdAt.toISOString(),
      closedAt: row.closedAt?.toISOString() ?? null,
    })),
    counts: {
      standing: of("open", "traced"),
      open: of("open"),
      traced: of("traced"),
      mended: of("mended"),
      "no-fault": of("no-fault"),
      all: of(...FAULT_STATES),
    },
    boards: boardRows,
    units: unitRows.map(({ serial }) => serial),
  };
}
