export { type NetlistDifference } from "./difference";
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
export { type LineNote, type NetlistReading } from "./reading";
