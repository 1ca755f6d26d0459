export { type ContinuityFinding, type ContinuityReport, type FindingKind } from "./finding";
export { PROBE_LIMIT_CLASSES, type LimitClass, type ProbeLimits } from "./limits";
export {
  type PlanOptions,
  type PointNumber,
  type Probe,
  type ProbeKind,
  type ProbePlan,
  type ProbeResult,
} from "./plan";
