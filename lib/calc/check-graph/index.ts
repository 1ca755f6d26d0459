export { byName } from "./by-name";
export { describeCircle, nameCheck } from "./name-check";
export { putInOrder, shortestWayRound, turnedRound, type Edges, type InOrder } from "./put-in-order";
export { openGraph, readGraph, type CheckGraph } from "./read-graph";
export { CHECK_STAGES, holds, type CheckStage, type CheckState, type StandingCheck } from "./standing-check";
