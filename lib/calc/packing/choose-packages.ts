import { partFor, type LogicPart } from "../logic-parts";
import { type BlockDesign, type GateCount } from "./design";

/** The usual part for every function that the design uses; the project's own go first. Functions without one are left out. */
export function choosePackages(
  blocks: readonly BlockDesign[],
  loose: readonly GateCount[],
  own: readonly LogicPart[] = [],
): Record<string, LogicPart> {
  const functions = new Set([...blocks.flatMap((block) => block.gates), ...loose].map((gate) => gate.gateFunction));
  return Object.fromEntries(
    [...functions].flatMap((gateFunction) => {
      const part = partFor(gateFunction, own);
      return part ? [[gateFunction, part] as const] : [];
    }),
  );
}
