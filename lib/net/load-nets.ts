import { database } from "@/db/client";
import type { ProjectScope } from "@/lib/access/scope";
import type { Machine } from "@/lib/calc/interconnect";
import { loadFindings, type FindingView } from "@/lib/finding/load-findings";
import { loadMachine } from "@/lib/machine/load-machine";
import { loadSignals, type SignalLine } from "@/lib/signal/load-signals";

/** The machine, from which every net is worked out where it is shown, with what is said of its signals and findings. */
export type NetsView = { machine: Machine; findings: FindingView[]; signals: SignalLine[] };

export async function loadNets(scope: ProjectScope): Promise<NetsView> {
  const [machine, { findings }, signals] = await Promise.all([
    loadMachine(database(), scope),
    loadFindings(scope),
    loadSignals(scope),
  ]);
  return { machine, findings, signals };
}
