export { findPart, gateFunctionName, LOGIC_PARTS, partFor, partsFor } from "./list";
export { partLabel } from "./part-label";
export { type FamilyFigures, type GatePins, type LogicPart, type PartOutput } from "./part";
