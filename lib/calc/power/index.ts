export { backplaneRail } from "./backplane-drop";
export { boardPower } from "./board-power";
export { type BoardPower, type DrawLine, type RailDraw } from "./budget";
export { currentWindows, type CurrentWindow } from "./current-window";
export {
  type BoardPowerInput,
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
  type MachineRail,
  type PoweredPlacement,
  type SlotDrop,
  type SupplyMargin,
} from "./machine-budget";
export { machinePower } from "./machine-power";
export { packageItem, type PackagePlan } from "./package-item";
export { switchingPower, ttlInputCurrent, type Switching } from "./switching-power";
