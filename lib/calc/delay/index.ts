export { delayWindow, type DelayWindow } from "./delay-window";
export { highestClock, type ClockInput, type ClockLimit } from "./highest-clock";
export {
  type DelayCondition,
  type DelayPath,
  type DelayStep,
  type Derating,
  type PathDelay,
  type StepDelay,
} from "./path";
export { pathDelay } from "./path-delay";
export { rippleCarrySteps } from "./ripple-carry";
export { stepOfPart } from "./step-of-part";
