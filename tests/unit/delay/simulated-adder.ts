/** Changes of a line: time and value, the first before time 0. */
type Wave = [time: number, value: boolean][];

export type GateTimes = { xor: number; and: number; or: number };
export type AdderInput = { a: number; b: number; carry: boolean };

const at = (wave: Wave, time: number): boolean => wave.findLast(([when]) => when <= time)?.[1] ?? false;

/** A gate with a plain delay: every change of an input arrives at the output that much later. */
function gate(delay: number, work: (x: boolean, y: boolean) => boolean, x: Wave, y: Wave): Wave {
  const times = [...new Set([...x, ...y].map(([time]) => time))].sort((one, other) => one - other);
  const output: Wave = [];
  for (const time of times) {
    const value = work(at(x, time), at(y, time));
    if (output.at(-1)?.[1] !== value) output.push([time + delay, value]);
  }
  return output;
}

const step = (before: boolean, after: boolean): Wave =>
  before === after
    ? [[-Infinity, before]]
    : [
        [-Infinity, before],
        [0, after],
      ];
const bit = (word: number, index: number): boolean => ((word >> index) & 1) === 1;
const settled = (wave: Wave): number => Math.max(0, wave.at(-1)?.[0] ?? 0);

/** Gate by gate: how long after the inputs change the carry out and the last sum bit settle, and to what. */
export function simulateAdder(bits: number, { xor, and, or }: GateTimes, before: AdderInput, after: AdderInput) {
  let carry = step(before.carry, after.carry);
  let lastSum: Wave = [];
  for (let index = 0; index < bits; index++) {
    const a = step(bit(before.a, index), bit(after.a, index));
    const b = step(bit(before.b, index), bit(after.b, index));
    const half = gate(xor, (x, y) => x !== y, a, b);
    lastSum = gate(xor, (x, y) => x !== y, half, carry);
    const generated = gate(and, (x, y) => x && y, a, b);
    const passed = gate(and, (x, y) => x && y, half, carry);
    carry = gate(or, (x, y) => x || y, generated, passed);
  }
  return {
    carryOutS: settled(carry),
    lastSumS: settled(lastSum),
    carryOut: at(carry, Infinity),
    lastSum: at(lastSum, Infinity),
  };
}
