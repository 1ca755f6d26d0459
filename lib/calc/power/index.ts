export { type BoardPower, type CurrentWindow, type DrawLine, type PowerProblem, type RailDraw } from "./budget";
export {
  type FixedItem,
  type LedItem,
  type PackageItem,
  type PowerItem,
  type PullUpItem,
  type RailSupply,
  type RegulatorItem,
  type Spread,
  type TypedDraw,
} from "./item";
export {
  type BackplaneRail,
  type ContactLoad,
  type MachinePower,
  type MachinePowerInput,
  type SlotDrop,
  type SupplyMargin,
} from "./machine-budget";
