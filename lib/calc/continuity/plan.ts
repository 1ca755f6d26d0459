import type { ProbeLimits } from "./limits";

/** A point by its number: nets in their order, points in theirs, then the unconnected ones; see pointBook. */
export type PointNumber = number;

/**
 * continuity: both points belong to one net. isolation: they belong to two. follow-up: asked for after the others, to tell
 * crossed wires from plain opens and which pieces of a net hang together.
 */
export type ProbeKind = "continuity" | "isolation" | "follow-up";

export type Probe = {
  /** Its place in the plan, from 0. */
  id: number;
  kind: ProbeKind;
  a: PointNumber;
  b: PointNumber;
  expect: "joined" | "apart";
  /** Joined: at most; apart: at least. In Ω. */
  limitOhm: number;
};

export type PlanOptions = {
  /** Parts are fitted: low test voltage, and isolation says no more than that there is no short. */
  populated: boolean;
  limits: ProbeLimits;
  /** Only this part: its pins to the rest of their nets, and its pins against each other. */
  connector?: string;
  /** Only these nets, and what lies beside them; bus ranges are taken apart, "+5 V" is "+5V". */
  signals?: readonly string[];
  /** Only supplies and grounds. */
  railsOnly?: boolean;
  /** Nets that are rails besides those that their names give away. */
  rails?: readonly string[];
  /** Also probe vias and mid-points of nets that have pins. */
  vias?: boolean;
  /** Also check that unconnected pads touch nothing. */
  unconnected?: boolean;
  /** Largest gap between the edges of two pads that still counts as beside each other; 1.27 mm when not given. */
  neighbourMm?: number;
};

export type ProbePlan = {
  /** In the order of probing: continuity, then rails against each other, then neighbours. */
  probes: Probe[];
  counts: { nets: number; points: number; continuity: number; isolation: number };
  /** Every net against every other instead of neighbours only. */
  everyPair: number;
  /** How many isolation probes that saves. */
  saved: number;
  /** Way of the two probe tips together, mm; null where no place is known. */
  travelMm: number | null;
  /** What one must know before touching a board with parts on it; null for a bare one. */
  caution: string | null;
  /** What the plan leaves out, or had to assume. */
  remarks: string[];
};

/** What one probing said; both null: nothing. An overload of the meter is Infinity or beeps: false. */
export type ProbeResult = { probe: number; beeps: boolean | null; ohm: number | null };
