import { database } from "@/db/client";
import { findNetlist, findNetlists } from "@/db/queries/netlists";
import { findContinuityChecks, findOwnTimes, findProbedUnit, findRounds, findTouched } from "@/db/queries/probing";
import type { NetlistSource } from "@/db/schema/netlists";
import type { ProjectScope } from "@/lib/access/scope";
import { pinName, type Netlist } from "@/lib/calc/netlist";
import { storedNetlist } from "@/lib/netlist/stored-netlist";
import { paceOf, type Pace } from "./own-pace";
import { aboutRound } from "./plan-round";
import { storedOptions } from "./stored-plan";
import { touchedSignals } from "./touched-signals";

export type RoundLine = {
  id: string;
  about: string;
  netlist: string;
  count: number;
  probed: number;
  by: string | null;
  startedAt: string;
  closedAt: string | null;
};

export type TouchedByRework = { number: number; what: string; signals: string[] };

export type RoundsView = {
  unit: { serial: string; archived: boolean; letter: string };
  board: { code: string; name: string };
  rounds: RoundLine[];
  netlists: { id: string; letter: string; number: number; source: NetlistSource; isOwnRevision: boolean }[];
  /** Of the netlist that is asked for, or of the newest one of the unit's revision. */
  chosen: { id: string; parts: string[]; signals: string[]; reworks: TouchedByRework[] } | undefined;
  checks: { id: string; title: string }[];
  pace: Pace;
};

const PACE_OF = 300;
/** Names that a form offers; more are typed. */
const OFFERED = 1500;

export async function loadRounds(
  scope: ProjectScope,
  serial: string,
  wanted: string | undefined,
): Promise<RoundsView | undefined> {
  const db = database();
  const unit = await findProbedUnit(db, scope, serial);
  if (!unit) return undefined;
  const [rounds, versions, checks, times, touched] = await Promise.all([
    findRounds(db, scope, unit.id),
    findNetlists(db, scope, unit.board.id),
    findContinuityChecks(db, scope, unit.id),
    findOwnTimes(db, scope, scope.viewer.userId, PACE_OF),
    findTouched(db, scope, unit.id),
  ]);
  const version =
    versions.find(({ id }) => id === wanted) ??
    versions.find(({ revisionId }) => revisionId === unit.revisionId) ??
    versions[0];
  const found = version ? await findNetlist(db, scope, version.id) : undefined;
  const netlist = found && storedNetlist(found.netlist.content);
  return {
    unit: { serial: unit.serial, archived: unit.archivedAt !== null, letter: unit.letter },
    board: unit.board,
    rounds: rounds.map(({ options, netlist: number, letter, createdAt, closedAt, attemptId: _, ...round }) => ({
      ...round,
      about: aboutRound(storedOptions(options).asked),
      netlist: `${letter} ${number}`,
      startedAt: createdAt.toISOString(),
      closedAt: closedAt?.toISOString() ?? null,
    })),
    netlists: versions.map(({ id, letter, number, source, revisionId }) => {
      return { id, letter, number, source, isOwnRevision: revisionId === unit.revisionId };
    }),
    chosen:
      found && netlist
        ? {
            id: found.netlist.id,
            parts: partsOf(netlist.nets),
            signals: netlist.nets.slice(0, OFFERED).map(({ name }) => name),
            reworks: touchedSignals(touched, netlist),
          }
        : undefined,
    checks: checks.map(({ id, title }) => ({ id, title })),
    pace: paceOf(times),
  };
}

type Nets = Netlist["nets"];

/** Parts by how many of their pins are in nets: connectors come first of their own accord. */
function partsOf(nets: Nets): string[] {
  const pins = new Map<string, Set<string>>();
  for (const { points } of nets) {
    for (const point of points) {
      if (point.part === "") continue;
      const own = pins.get(point.part) ?? new Set();
      pins.set(point.part, own.add(pinName(point)));
    }
  }
  const isConnector = (part: string) => /^[JXP]\d/.test(part);
  return [...pins.keys()]
    .sort((a, b) => Number(isConnector(b)) - Number(isConnector(a)) || a.localeCompare(b, "en", { numeric: true }))
    .slice(0, OFFERED);
}
