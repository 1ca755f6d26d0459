import { type SpareGate } from "./packing";
import { type Placed } from "./place-gates";

type Technology = "CMOS" | "bipolar";

/**
 * The spare gates with what their pins want. An open CMOS input drifts between the levels, takes current and may
 * oscillate, so it goes to ground, or to the rail where low would set, reset or enable something. An open bipolar input
 * reads high but catches noise: ground as well, and the rail through 1 kΩ. Outputs stay open.
 * Common practice, no source; makers' handling notes say the same of CMOS inputs.
 */
export function tieSpares(placed: readonly Placed[], technology: Technology): SpareGate[] {
  return placed.flatMap((one) =>
    one.gates.flatMap((gate, index): SpareGate[] => {
      if (gate.usedBy !== null) return [];
      const tieHigh = one.logic.pinout?.[index]?.restHigh ?? [];
      const tieLow = (gate.inputs ?? []).filter((pin) => !tieHigh.includes(pin));
      const spare = {
        designator: one.designator,
        part: one.part,
        gate: gate.gate,
        gateFunction: one.gateFunction,
        inputCount: one.logic.inputsPerGate,
        tieLow,
        tieHigh,
        leaveOpen: gate.outputs ?? [],
      };
      return [{ ...spare, sentence: spareSentence(spare, gate.inputs !== null, technology) }];
    }),
  );
}

function spareSentence(spare: Omit<SpareGate, "sentence">, pinsKnown: boolean, technology: Technology): string {
  const gate = `${spare.designator} gate ${spare.gate} (${spare.part})`;
  if (!pinsKnown) {
    const inputs = spare.inputCount === 1 ? "its input" : `its ${spare.inputCount} inputs`;
    return `${gate}: ${inputs} to ground, outputs stay open.`;
  }
  const rail = technology === "CMOS" ? "to the rail" : "to the rail through 1 kΩ";
  const parts = [
    spare.tieLow.length > 0 ? `${pinsText(spare.tieLow)} to ground` : "",
    spare.tieHigh.length > 0 ? `${pinsText(spare.tieHigh)} ${rail}` : "",
    spare.leaveOpen.length > 0
      ? `${pinsText(spare.leaveOpen)} ${spare.leaveOpen.length > 1 ? "stay" : "stays"} open`
      : "",
  ];
  return `${gate}: ${parts.filter(Boolean).join(", ")}.`;
}

function pinsText(pins: readonly number[]): string {
  const sorted = [...pins].sort((a, b) => a - b);
  const last = sorted.at(-1);
  return sorted.length < 2 ? `pin ${last}` : `pins ${sorted.slice(0, -1).join(", ")} and ${last}`;
}

/** Spares of one part together, as the rule check takes them (`BoardDesign.untiedSpares`). */
export function groupSpares(
  spares: readonly SpareGate[],
  family: string,
): { part: string; gates: number; inputs: number; family: string }[] {
  const groups = new Map<string, { part: string; gates: number; inputs: number; family: string }>();
  for (const { part, inputCount } of spares) {
    const group = groups.get(part) ?? { part, gates: 0, inputs: 0, family };
    groups.set(part, { ...group, gates: group.gates + 1, inputs: group.inputs + inputCount });
  }
  return [...groups.values()];
}
