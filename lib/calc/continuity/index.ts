export { estimateTime } from "./estimate-time";
export { findContinuityFaults } from "./find-continuity-faults";
export { type ContinuityFinding, type ContinuityReport, type FindingKind } from "./finding";
export { followUpProbes } from "./follow-up-probes";
export { isolationWays } from "./isolation-ways";
export { PROBE_LIMIT_CLASSES, type LimitClass, type ProbeLimits } from "./limits";
export {
  type PlanOptions,
  type PointNumber,
  type Probe,
  type ProbeKind,
  type ProbePlan,
  type ProbeResult,
} from "./plan";
export { planProbes } from "./plan-probes";
export { pointBook, type PointBook } from "./point-book";
export { effectiveLimits } from "./populated";
export { isRailName } from "./rail-name";
