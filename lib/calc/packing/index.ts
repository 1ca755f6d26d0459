export { choosePackages } from "./choose-packages";
export { type BlockDesign, type GateCount, type PackingInput, type PackingMode, type PackingProblem } from "./design";
export { findCycle } from "./find-cycle";
export { pack, type PackingResult } from "./pack";
export {
  type Decoupling,
  type PackageLine,
  type PackedGate,
  type Packing,
  type PlacedPackage,
  type SpareGate,
} from "./packing";
export { groupSpares } from "./tie-spares";
