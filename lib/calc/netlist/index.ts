export { compareNetlists } from "./compare-netlists";
export { type NetlistDifference } from "./difference";
export { type IpcScale } from "./ipc/scale";
export {
  type Net,
  type Netlist,
  type NetlistFact,
  type NetPair,
  type NetPoint,
  type Outline,
  type Place,
  type PointKind,
  type Side,
  type ToolingHole,
} from "./netlist";
export { listed } from "./listed";
export { netlistOfDesign } from "./netlist-of-design";
export {
  PIN_LIST_COLUMNS,
  PIN_LIST_HEADER,
  readPinList,
  writePinList,
  type PinListColumns,
  type PinListRow,
  type PinListUnit,
} from "./pin-list";
export { pinName } from "./pin-name";
export { readIpcD356 } from "./read-ipc-d356";
export { type LineNote, type NetlistReading } from "./reading";
