export { applyEdits } from "./apply-edits";
export { assembleNets } from "./assemble-nets";
export { DisjointSets } from "./disjoint-sets";
export { checkMachine, checkRules, type MachineCheck } from "./check";
export { type Edit, type Finding, type PinAt, type Weight } from "./finding";
export { netsByPin, pinKey } from "./look-up-net";
export {
  PIN_ROLES,
  SIGNAL_CLASSES,
  type BoardDesign,
  type ConnectorAt,
  type DesignConnector,
  type DesignPin,
  type Draw,
  type Machine,
  type Mating,
  type PinRole,
  type Placement,
  type PlanConditions,
  type Rail,
  type SignalClass,
  type SignalFacts,
} from "./machine";
export { type Net, type NetPin } from "./net";
export { netFacts, netFactsOf, type NetFacts, type NetParty, type WorstMargin } from "./net-facts";
export { studyNet } from "./study-net";
