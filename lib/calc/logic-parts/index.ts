export { findPart, gateFunctionName, LOGIC_PARTS, partFor, partsFor } from "./list";
export { type FamilyFigures, type GatePins, type LogicPart, type PartOutput } from "./part";
