import { z } from "zod";
import { delayWindow, highestClock, pathDelay } from "@/lib/calc/delay";
import { defineCalculation, faulty, type Outcome } from "./define-calculation";
import { familyField, familyOf } from "./family-field";
import { count, name, picofarads, seconds, volts } from "./fields";

const step = z.strictObject({
  name,
  count: count.default(1),
  minS: seconds.nullable().default(null),
  typicalS: seconds.nullable().default(null),
  maxS: seconds.nullable().default(null),
});
const condition = z.strictObject({ volts, loadPf: picofarads });

const input = z.strictObject({
  steps: z.array(step).min(1).max(500),
  derating: z
    .strictObject({ family: familyField, typicalAt: condition, limitsAt: condition, board: condition })
    .nullable()
    .default(null)
    .describe("Null: the figures are taken as they are."),
  unknownMinShare: z.number().min(0).max(1).nullable().default(null),
  unknownMaxShare: z.number().min(1).max(10).nullable().default(null),
  clock: z
    .strictObject({
      clockToOutputMaxS: seconds,
      setupS: seconds,
      skewS: seconds.default(0),
      hold: z.strictObject({ clockToOutputMinS: seconds.nullable(), holdS: seconds }).nullable().default(null),
    })
    .nullable()
    .default(null)
    .describe("Registers at both ends of the path; null: no clock is asked for."),
});

export const delay = defineCalculation({
  name: "delay",
  about: "Lowest, typical and highest delay of a chain of parts, the window for a capture, and the highest clock.",
  source:
    "Sums of the steps; worst case, and root-sum-square named as such: common practice, no source. Period ≥ clock to output + path + set-up + skew: common practice.",
  leavesOut: "Copper (about 6 ns a metre), slow input edges, which edge of a gate is the slower, jitter, the scope.",
  most: "500 steps.",
  input,
  example: {
    steps: [
      { name: "74HC86", count: 1, typicalS: 14e-9, maxS: 24e-9 },
      { name: "74HC08", count: 8, typicalS: 9e-9, maxS: 18e-9 },
      { name: "74HC32", count: 8, typicalS: 9e-9, maxS: 18e-9 },
    ],
    clock: { clockToOutputMaxS: 35e-9, setupS: 20e-9 },
  },
  run: ({ steps, derating, unknownMinShare, unknownMaxShare, clock }): Outcome => {
    const family = derating && familyOf("derating.family", derating.family);
    if (family && !family.ok) return faulty(family);
    const turned = derating && family ? { ...derating, family: family.value } : null;
    const path = pathDelay({ steps, derating: turned, unknownMinShare, unknownMaxShare });
    if (!path.ok) return faulty(path);
    const window = delayWindow(path.value);
    if (!clock) return { ok: true, result: { path: path.value, window, clock: null } };
    const limit = highestClock({ path: path.value, ...clock });
    return limit.ok ? { ok: true, result: { path: path.value, window, clock: limit.value } } : faulty(limit, "clock");
  },
});
