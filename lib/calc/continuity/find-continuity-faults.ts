import type { Netlist } from "../netlist";
import { findCrossed } from "./crossed";
import { describeCrossed } from "./describe-crossed";
import { describeOpen } from "./describe-opens";
import { describePoor } from "./describe-poor";
import { describeShorts } from "./describe-shorts";
import type { ContinuityReport } from "./finding";
import type { Probe, ProbeResult } from "./plan";
import { reportRemarks } from "./report-remarks";
import { studyResults } from "./study";

/**
 * What the results of a plan come to, with the probes of followUpProbes among them once these were made: crossed wires, shorts,
 * opens, and resistances that are not as they should be. A crossed pair is told from two opens only when both ways across
 * were probed. One net in pieces is one finding, and nets that touch are one finding, however many probes say so.
 */
export function findContinuityFaults(
  netlist: Netlist,
  probes: readonly Probe[],
  results: readonly ProbeResult[],
): ContinuityReport {
  const study = studyResults(netlist, probes, results);
  const crossed = findCrossed(study);
  const isCrossed = new Set(crossed.flatMap(({ nets }) => nets));
  const explained = new Set(crossed.flatMap(({ joins }) => joins));
  const touching = study.joins.filter((join) => !explained.has(join));
  const opens = [...study.breaks].filter(([net]) => !isCrossed.has(net));
  const left: ContinuityReport["left"] = { continuity: 0, isolation: 0, "follow-up": 0 };
  const done = new Set(study.said.map(({ probe }) => probe.id));
  for (const { id, kind } of probes) if (!done.has(id)) left[kind] += 1;
  return {
    findings: [
      ...crossed.map((group) => describeCrossed(study, group)),
      ...describeShorts(study, touching),
      ...opens.map(([net, breaks]) => describeOpen(study, net, breaks)),
      ...describePoor(study),
    ],
    repeat: study.said
      .filter(({ probe, outcome }) => probe.kind === "isolation" && outcome !== "joined" && touchesOpen(probe))
      .map(({ probe }) => probe.id),
    left,
    remarks: reportRemarks(study),
  };

  function touchesOpen({ a, b }: Probe): boolean {
    return study.pieces.has(study.netOf(a)) || study.pieces.has(study.netOf(b));
  }
}
