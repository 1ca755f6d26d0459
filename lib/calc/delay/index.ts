export {
  type ClockInput,
  type ClockLimit,
  type DelayPath,
  type DelayProblem,
  type DelayStep,
  type DelayWindow,
  type Derating,
  type PathDelay,
  type StepDelay,
} from "./path";
