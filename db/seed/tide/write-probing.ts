import { and, eq } from "drizzle-orm";
import type { Database } from "@/db/client";
import { boards, revisions } from "@/db/schema/boards";
import type { ProjectScope } from "@/lib/access/scope";
import { keepNetlist } from "@/lib/netlist/keep-netlist";
import { keepNetlistInput } from "@/lib/netlist/schema";
import { loadNetlists } from "@/lib/netlist/load-netlists";
import { loadRound } from "@/lib/probing/load-round";
import { sayProbes } from "@/lib/probing/say-probes";
import { sayProbesInput, startRoundInput } from "@/lib/probing/schema";
import { startRound } from "@/lib/probing/start-round";
import { eveningAt, type Happening } from "./calendar";
import { constituentNetlist } from "./constituent-netlist";
import { granted } from "./granted";
import type { Cast } from "./tell-story";

const KEPT_DAYS_AGO = 54;
const PROBED_DAYS_AGO = 2;
const SECONDS_EACH = 9;
const UNIT = "CON-02";

const write = (scope: ProjectScope) => ({ project: scope.slug, writeId: crypto.randomUUID() });

/** The netlist of the constituent card, and a round that is half done on its second unit. */
export function probingHappenings(db: Database, cast: Cast, now: Date): Happening[] {
  const [maud, bram] = [cast.maud.scope, cast.bram.scope];
  const begun = eveningAt(now, PROBED_DAYS_AGO, 90, bram.timeZone);
  return [
    { at: eveningAt(now, KEPT_DAYS_AGO, 20, maud.timeZone), work: () => keep(db, maud) },
    { at: begun, work: () => probeHalf(bram, begun) },
  ];
}

async function keep(db: Database, scope: ProjectScope) {
  const [revision] = await db
    .select({ id: revisions.id })
    .from(revisions)
    .innerJoin(boards, eq(boards.id, revisions.boardId))
    .where(and(eq(boards.projectId, scope.projectId), eq(boards.code, "CON"), eq(revisions.letter, "A")));
  if (!revision) throw new Error("the demo has no revision A of CON");
  const file = { source: "ipc-d-356", fileName: "con-a.ipc", text: constituentNetlist(), scale: null };
  granted(await keepNetlist(scope, keepNetlistInput.parse({ ...write(scope), revisionId: revision.id, given: file })));
}

async function probeHalf(scope: ProjectScope, begun: Date) {
  const view = await loadNetlists(scope, "CON", { before: undefined, after: undefined });
  const netlistId = view?.versions[0]?.id;
  const options = {
    ...{ populated: true, limits: "3", continuityOhm: "", isolationOhm: "", only: "connector", connector: "J1" },
    ...{ signals: [], vias: false, unconnected: false },
  };
  const asked = startRoundInput.parse({ ...write(scope), unit: UNIT, netlistId, options, checkId: null });
  const { id: plan } = granted(await startRound(scope, asked));
  const probes = (await loadRound(scope, plan))?.probes ?? [];
  const results = probes.slice(0, Math.floor(probes.length / 2)).map(({ expect }, probe) => ({
    ...{ id: crypto.randomUUID(), probe, typed: "", beeps: expect === "joined" },
    performedAt: new Date(begun.getTime() + probe * SECONDS_EACH * 1000).toISOString(),
  }));
  for (let from = 0; from < results.length; from += 200) {
    const batch = results.slice(from, from + 200);
    granted(await sayProbes(scope, sayProbesInput.parse({ project: scope.slug, plan, results: batch, voids: [] })));
  }
}
