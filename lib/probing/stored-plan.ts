import type { Probe } from "@/lib/calc/continuity";
import type { PlanFigures } from "./round-view";
import type { RoundOptions } from "./schema";

export type StoredOptions = { asked: RoundOptions; figures: PlanFigures };

/** What startRound() wrote: the same types by construction, probes are only ever added. */
export const storedOptions = (options: unknown): StoredOptions => options as StoredOptions;
export const storedProbes = (probes: unknown): Probe[] => probes as Probe[];
