import type { PointNumber, ProbeKind } from "./plan";

/**
 * open: a net in pieces. short: nets joined that should not be. crossed: two nets that change places on the way.
 * high resistance: joined, but badly. leak: apart, but not well enough.
 */
export type FindingKind = "open" | "short" | "crossed" | "high resistance" | "leak";

export type ContinuityFinding = {
  kind: FindingKind;
  /** Names, the worst or first one first; an unconnected pad goes by its pin. */
  nets: string[];
  /** open: the pieces of the net, the largest first. crossed: the ends that belong together. Others: points that showed it. */
  pieces: PointNumber[][];
  /** "U1-3" of the points that matter, for a fault's list of pins. */
  pins: string[];
  /** Probes that showed it. */
  probes: number[];
  sentence: string;
  /** Where to look first. */
  lookAt: string;
  /** Mend this one first: what else was found on these nets means little until then; empty where nothing is in the way. */
  mendFirst: string;
};

export type ContinuityReport = {
  /** Crossed pairs and shorts first, then opens, then the rest. */
  findings: ContinuityFinding[];
  /** Isolation probes that speak only for a piece of their net, because the net is open: probe them again after mending. */
  repeat: number[];
  /** Probes without a result. */
  left: Record<ProbeKind, number>;
  remarks: string[];
};
