import { randomUUID } from "node:crypto";
import type { ProjectScope } from "@/lib/access/scope";
import { keepNetlist } from "@/lib/netlist/keep-netlist";
import { keepNetlistInput } from "@/lib/netlist/schema";
import { sayProbes } from "@/lib/probing/say-probes";
import { sayProbesInput, startRoundInput } from "@/lib/probing/schema";
import { startRound } from "@/lib/probing/start-round";
import { must } from "./bench";

/** Six nets between two connectors and one chip: pins 1 to 6 of J1, J2 and U1. */
export const SIX_NETS = ["A", "B", "C", "D", "E", "F"]
  .flatMap((net, at) => ["J1", "J2", "U1"].map((part) => `${net},${part},${at + 1}`))
  .join("\n");

export const pinList = (text: string) => ({
  source: "pin-list" as const,
  fileName: "list.csv",
  text,
  delimiter: "comma" as const,
  hasHeadings: false,
  columns: { net: 0, part: 1, pin: 2, x: null, y: null },
  unit: "mm" as const,
});

export const keepInput = (scope: ProjectScope, revisionId: string, text = SIX_NETS) =>
  keepNetlistInput.parse({ project: scope.slug, writeId: randomUUID(), revisionId, given: pinList(text) });

export const keep = (scope: ProjectScope, revisionId: string, text = SIX_NETS) =>
  must(keepNetlist(scope, keepInput(scope, revisionId, text)));

export const WHOLE = {
  ...{ populated: false, limits: "3", continuityOhm: "", isolationOhm: "", only: "all", connector: "" },
  ...{ signals: [], vias: false, unconnected: false },
};

export const roundInput = (scope: ProjectScope, unit: string, netlistId: string, options: object = {}) =>
  startRoundInput.parse({
    ...{ project: scope.slug, writeId: randomUUID(), unit, netlistId, checkId: null },
    options: { ...WHOLE, ...options },
  });

export async function startedRound(scope: ProjectScope, unit: string, revisionId: string) {
  const { id: netlistId } = await keep(scope, revisionId);
  return must(startRound(scope, roundInput(scope, unit, netlistId)));
}

export const said = (probe: number, answer: boolean | string, id: string = randomUUID()) => ({
  ...{ id, probe },
  beeps: typeof answer === "string" ? null : answer,
  typed: typeof answer === "string" ? answer : "",
  performedAt: new Date().toISOString(),
});

export const say = (scope: ProjectScope, plan: string, results: object[], voids: string[] = []) =>
  sayProbes(scope, sayProbesInput.parse({ project: scope.slug, plan, results, voids }));
