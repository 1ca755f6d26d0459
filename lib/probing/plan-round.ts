import {
  effectiveLimits,
  planProbes,
  PROBE_LIMIT_CLASSES,
  type PlanOptions,
  type Probe,
  type ProbeLimits,
} from "@/lib/calc/continuity";
import type { Netlist } from "@/lib/calc/netlist";
import type { RoundOptions } from "./schema";
import type { PlanFigures, RoundLimits } from "./round-view";
import { formatQuantity } from "@/lib/calc/units";

export type PlannedRound = { probes: Probe[]; figures: PlanFigures };

export function planRound(netlist: Netlist, options: RoundOptions, rails: readonly string[]): PlannedRound {
  const { probes, ...figures } = planProbes(netlist, planOptions(options, rails));
  return { probes, figures };
}

function planOptions(options: RoundOptions, rails: readonly string[]): PlanOptions {
  const { populated, only, connector, signals, vias, unconnected } = options;
  return {
    ...{ populated, vias, unconnected, rails },
    limits: limitsOf(options),
    ...(only === "connector" ? { connector } : {}),
    ...(only === "signals" ? { signals } : {}),
    ...(only === "rails" ? { railsOnly: true } : {}),
  };
}

function limitsOf({ limits, continuityOhm, isolationOhm }: RoundOptions): ProbeLimits {
  const known = PROBE_LIMIT_CLASSES.find((one) => one.class === limits);
  if (known) return known;
  return { class: "own", continuityOhm: continuityOhm ?? 10, isolationOhm: isolationOhm ?? 10e6, testVolts: null };
}

export function roundLimits(options: RoundOptions): RoundLimits {
  const { continuityOhm, isolationOhm } = effectiveLimits(limitsOf(options), options.populated);
  const ohms = (value: number) => formatQuantity({ value, unit: "Ω" });
  const words = `joined at most ${ohms(continuityOhm)}, apart at least ${ohms(isolationOhm)}`;
  return { joinedOhm: continuityOhm, apartOhm: isolationOhm, words };
}

/** What a round is about, in words. */
export function aboutRound({ only, connector, signals, populated }: RoundOptions): string {
  const what = {
    all: "the whole board",
    connector: `only ${connector}`,
    signals:
      signals.length > 3
        ? `only ${signals.slice(0, 2).join(", ")} and ${signals.length - 2} more`
        : `only ${signals.join(", ")}`,
    rails: "only rails and grounds",
  }[only];
  return `${populated ? "populated" : "bare"}, ${what}`;
}
