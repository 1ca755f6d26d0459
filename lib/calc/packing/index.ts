export { type BlockDesign, type GateCount, type PackingInput, type PackingMode, type PackingProblem } from "./design";
export {
  type Decoupling,
  type PackageLine,
  type PackedGate,
  type Packing,
  type PlacedPackage,
  type SpareGate,
} from "./packing";
