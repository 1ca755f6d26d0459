export { pullUpBehaviour, type PullUpBehaviour } from "./behaviour";
export { inParallelOhm, judgePullUp, type PullUpJudgement } from "./judge";
export { type PullUpLimits } from "./limits";
export { lineOf, type Line, type LineConditions } from "./line";
export { ohmForRise, RISE_DEFINITIONS, riseTimeS, type RiseDefinition } from "./rise-time";
export { OFFERED_SERIES, pullUpWindow, type OfferedSeries, type PullUpWindow } from "./window";
