import { type DelayStep } from "./path";

type GateDelay = Omit<DelayStep, "count">;

/**
 * The two slowest paths of a ripple-carry adder of n full adders (2 XOR, 2 AND, 1 OR each):
 * T(carry out) = tX + n(tA + tO) and T(sum n−1) = 2tX + (n−1)(tA + tO).
 *
 * Source: derived; check values computed and simulated. Not every pattern shows it: FFh + 00h to FFh + 01h takes one XOR
 * less. An operand bit of stage 0 that rises while all stages pass the carry on (FEh, 00h, carry in 1) shows it.
 * `bits` must be a whole number from 1; the steps are refused by `pathDelay` otherwise.
 */
export function rippleCarrySteps(
  bits: number,
  { xor, and, or }: { xor: GateDelay; and: GateDelay; or: GateDelay },
): { carryOut: DelayStep[]; lastSum: DelayStep[] } {
  const stages = (count: number): DelayStep[] => [
    { ...and, count },
    { ...or, count },
  ];
  return {
    carryOut: [{ ...xor, count: 1 }, ...stages(bits)],
    lastSum: [{ ...xor, count: 2 }, ...(bits === 1 ? [] : stages(bits - 1))],
  };
}
