import { shortQuantity } from "../units";
import { type DrawLine, type RailDraw } from "./budget";
import { type RegulatorItem, type Spread } from "./item";

/**
 * What a regulator takes from its input for the current of its output.
 * Linear: output current + ground current, whatever the input. Switching: Uout · Iout / (efficiency · Uin), at worst with
 * the input at the lower end of its tolerance. Leaves out: efficiency that falls at small loads, current while starting.
 */
export function drawOfRegulator(
  { label, rail, outputVolts, type }: RegulatorItem,
  output: Pick<RailDraw, "taken" | "atRestA">,
  input: { volts: number; tolerancePercent: number },
): DrawLine {
  const lowest = input.volts * (1 - input.tolerancePercent / 100);
  const turned = (outputA: number, volts: number): number =>
    type.kind === "linear" ? outputA + type.groundA : (outputVolts * outputA) / (type.efficiency * volts);
  const amps: Spread = {
    typical: turned(output.taken.typical, input.volts),
    worst: turned(output.taken.worst, type.kind === "linear" ? input.volts : lowest),
  };
  const reason = `for ${shortQuantity(output.taken.worst, "A")} at ${shortQuantity(outputVolts, "V")} at worst`;
  return { label, kind: "regulator", rail, count: 1, amps, atRestA: turned(output.atRestA, input.volts), reason };
}
