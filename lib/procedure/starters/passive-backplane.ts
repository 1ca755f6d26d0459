import { afterSoldering } from "./after-soldering";
import { FIRST_POWER_CAUTION } from "./first-power";
import { row, type Starter } from "./starter";
import { OUTPUTS_CAUTION } from "./together";
import { groundContinuity, railsApart } from "./unpowered";

export const passiveBackplane: Starter = {
  id: "passive-backplane",
  name: "Passive backplane",
  description: "Connectors and copper, perhaps pull-ups and capacitors, nothing that switches.",
  checks: [
    ...afterSoldering({ hasPolarised: false, hasValues: true }),
    {
      id: "connectors",
      stage: "inspection",
      title: "Connectors straight, keyed and complete",
      instruction:
        "Sight along each row: no pin bent, pushed back or missing; every connector flat on the board; keys on the side the drawing shows. Try a bare card in every slot.",
      holdPoint: true,
      kind: "statement",
      typed: { expects: "a bare card goes into every slot" },
    },
    groundContinuity("a ground pin of every slot, first and last position"),
    railsApart(["+5 V to GND", "+12 V to GND", "-12 V to GND", "+5 V to +12 V", "+5 V to -12 V", "+12 V to -12 V"]),
    {
      id: "rail-copper",
      stage: "continuity",
      title: "Each rail reaches the furthest slot",
      instruction: "From the supply slot's pin to the same rail in the furthest slot. Take off what the leads have.",
      kind: "table",
      typed: {
        columns: ["furthest slot"],
        rows: [
          row("+5 V", "Ω", "< 0.2 Ω"),
          row("+12 V", "Ω", "< 0.5 Ω"),
          row("-12 V", "Ω", "< 0.5 Ω"),
          row("GND", "Ω", "< 0.2 Ω"),
        ],
      },
      covers: { rails: ["+5 V", "+12 V", "-12 V", "GND"] },
    },
    {
      id: "lines-through",
      stage: "continuity",
      title: "Every signal goes through all its slots",
      instruction:
        "With the beeper from the first slot to the last that the drawing shows, position by position. Mark each on the print.",
      reference: "IPC-9252, in outline",
      kind: "statement",
      typed: { expects: "every position as drawn" },
    },
    {
      id: "lines-apart",
      stage: "continuity",
      title: "No signal touches its neighbour",
      instruction: "In one slot: each position to the next in its row, then across the rows.",
      reference: "IPC-9252, in outline",
      holdPoint: true,
      kind: "statement",
      typed: { expects: "no beep between any two" },
    },
    {
      id: "pull-ups",
      stage: "continuity",
      title: "Pull-ups have their value",
      instruction: "From each pulled-up line to its rail.",
      kind: "reading",
      typed: { unit: "Ω", limits: "2k2 ± 5 %", expected: "2k2" },
      covers: { rails: ["+5 V"] },
    },
    {
      id: "first-power",
      stage: "power-on",
      title: "Current with no card in",
      instruction:
        "Set +5.0 V and a current limit of 50 mA with the outputs shorted, then connect the bare backplane; then the other rails, one after the other. Nothing on a passive backplane should draw more than its pull-ups and lamps.",
      caution: FIRST_POWER_CAUTION,
      holdPoint: true,
      kind: "reading",
      typed: { unit: "A", limits: "< 20 mA", expected: "" },
      covers: { rails: ["+5 V", "+12 V", "-12 V"] },
      needs: ["rails-apart", "lines-apart"],
    },
    {
      id: "right-pins",
      stage: "power-on",
      title: "Each rail on its pins and nowhere else",
      instruction:
        "In every slot, black probe on ground, red over all positions. Rails only where the drawing has them: a card meets whatever is here.",
      caution: "Fine tips: two pins bridged by a probe short the rail.",
      holdPoint: true,
      kind: "table",
      typed: {
        columns: ["first slot", "last slot"],
        rows: [
          row("+5 V", "V", "4.9 … 5.1 V"),
          row("+12 V", "V", "12 V ± 2 %"),
          row("-12 V", "V", "-12.24 … -11.76 V"),
          row("highest on any other pin", "V", "-0.1 … 5.1 V"),
        ],
      },
      covers: { rails: ["+5 V", "+12 V", "-12 V"] },
      needs: ["first-power"],
    },
    {
      id: "cross-talk",
      stage: "function",
      title: "Clock line and its neighbours",
      instruction:
        "Drive the clock position from a generator through 50 Ω at the real edge speed. Look at the far end and at the two neighbouring lines; keep the picture.",
      kind: "capture",
      typed: { expects: "one clean edge, neighbours below 0.5 V" },
      covers: { signals: ["CLK"] },
    },
    {
      id: "one-card",
      stage: "integration",
      title: "With the first proven card",
      instruction:
        "Supply card alone, then one proven card in each slot in turn, machine switched off between. Rails at the card, current from the supply.",
      caution: "Never plug or pull a card while the machine has power. Wait until the rails have discharged.",
      kind: "statement",
      typed: { expects: "the same in every slot" },
      needs: ["right-pins"],
    },
    {
      id: "full",
      stage: "integration",
      title: "All cards in: drop on +5 V and ground",
      instruction: "Supply slot to furthest slot, everything running: the drop on +5 V and the drop on ground, added.",
      caution: OUTPUTS_CAUTION,
      kind: "reading",
      typed: { unit: "V", limits: "< 100 mV", expected: "" },
      covers: { rails: ["+5 V", "GND"] },
    },
  ],
};
