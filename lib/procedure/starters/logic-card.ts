import { afterSoldering } from "./after-soldering";
import { firstPower, nothingGetsHot, railsWithAndWithoutLoad, ripple } from "./first-power";
import type { Starter } from "./starter";
import { insertion, railsTogether, soakTest } from "./together";
import { groundContinuity, railsToGround } from "./unpowered";

const RAILS = [{ name: "+5 V", limits: "4.75 … 5.25 V" }];

export const logicCard: Starter = {
  id: "logic-card",
  name: "Logic card",
  description: "Gates, registers, counters or memories on one rail, with a clock and a reset.",
  checks: [
    ...afterSoldering({ hasPolarised: true, hasValues: true }),
    railsToGround([{ name: "+5 V", atLeast: "200 Ω" }]),
    groundContinuity("the ground pin of every package and every ground pin of the edge connector"),
    {
      id: "supply-pins",
      stage: "continuity",
      title: "Supply pin of every package reaches the rail",
      instruction:
        "From the +5 V test point to the supply pin of each package, on the pin and not on the pad: so a pin that was never soldered is found. The worst is the reading.",
      kind: "reading",
      typed: { unit: "Ω", limits: "< 0.5 Ω", expected: "0.1 Ω" },
      covers: { rails: ["+5 V"] },
    },
    {
      id: "edge-neighbours",
      stage: "continuity",
      title: "No bridge between neighbouring pins of the edge connector",
      instruction:
        "With the beeper, along each row pin to next pin, then across the rows. Pins that carry the same net are listed on the drawing.",
      kind: "statement",
      typed: { expects: "no beep but where the drawing says" },
    },
    {
      id: "inputs-tied",
      stage: "continuity",
      title: "Unused inputs are tied",
      instruction:
        "From each unused input to +5 V or ground, as the drawing says. A floating CMOS input draws current and picks up anything.",
      kind: "statement",
      typed: { expects: "every unused input below 10 kΩ to a rail" },
    },
    firstPower({ rail: "+5.0 V", limit: "0.25 A", window: "1 … 190 mA", needs: ["rails-to-ground", "polarity"] }),
    nothingGetsHot(),
    railsWithAndWithoutLoad(RAILS, ["no clock", "clock running"]),
    ripple("+5 V", "< 100 mV"),
    {
      id: "reset",
      stage: "function",
      title: "Reset holds and lets go",
      instruction:
        "Pull reset low by hand, then release it: every register shows its reset value, and starts at the next clock edge.",
      kind: "statement",
      typed: { expects: "all registers at reset value" },
      covers: { signals: ["RESET_N"] },
    },
    {
      id: "clock",
      stage: "function",
      title: "Clock at the furthest package",
      instruction:
        "Counter or scope, ×10 probe, at the clock pin of the package furthest from where the clock comes in.",
      kind: "reading",
      typed: { unit: "Hz", limits: "3.6864 MHz ± 100 ppm", expected: "3.6864 MHz" },
      covers: { signals: ["CLK"] },
    },
    {
      id: "clock-edge",
      stage: "function",
      title: "Clock edge is clean",
      instruction:
        "Rising and falling edge at the same pin, 10 ns a division or faster, short ground spring. One crossing of the threshold in each edge; keep the picture and the data.",
      kind: "capture",
      typed: { expects: "one edge, no step at the threshold" },
      covers: { signals: ["CLK"] },
      needs: ["clock"],
    },
    {
      id: "levels",
      stage: "function",
      title: "Low and high level of a loaded output",
      instruction: "At the output with the most loads, clock stopped: once low, once high.",
      kind: "table",
      typed: {
        columns: ["level"],
        rows: [
          { label: "low", unit: "V", limits: "< 0.4 V", cells: [] },
          { label: "high", unit: "V", limits: "> 3.8 V", cells: [] },
        ],
      },
    },
    {
      id: "slow-function",
      stage: "function",
      title: "It does what it is for, slow clock",
      instruction:
        "Step the clock by hand or at a few hertz through every state that the drawing promises. Write down the first wrong one; do not go on past it.",
      holdPoint: true,
      kind: "statement",
      typed: { expects: "every state as drawn" },
      needs: ["reset"],
    },
    {
      id: "fast-function",
      stage: "function",
      title: "It does what it is for, full clock",
      instruction: "The same at full clock, for at least a minute, with the rail at its lower and its upper limit.",
      kind: "statement",
      typed: { expects: "no error in a minute at 4.75 V and 5.25 V" },
      needs: ["clock-edge"],
    },
    insertion(),
    railsTogether(RAILS),
    {
      id: "bus",
      stage: "integration",
      title: "Shared lines with the neighbours",
      instruction:
        "Every line this card shares with others: nobody else drives it at the same time, and it is never left floating.",
      kind: "capture",
      typed: { expects: "no step between the levels on any shared line" },
      needs: ["seated"],
    },
    soakTest("At full clock."),
  ],
};
