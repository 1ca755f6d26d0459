import { afterSoldering } from "./after-soldering";
import { firstPower, nothingGetsHot, railsWithAndWithoutLoad, ripple } from "./first-power";
import { row, type Starter } from "./starter";
import { insertion, OUTPUTS_CAUTION, railsTogether, soakTest } from "./together";
import { groundContinuity, railsApart, railsToGround } from "./unpowered";

const RAILS = [
  { name: "+5 V", limits: "4.75 … 5.25 V" },
  { name: "+12 V", limits: "12 V ± 5 %" },
  { name: "-12 V", limits: "-12.6 … -11.4 V" },
];

export const mixedSignalCard: Starter = {
  id: "mixed-signal-card",
  name: "Mixed-signal card",
  description: "Converters, amplifiers or drivers beside logic; perhaps something outside that moves.",
  checks: [
    ...afterSoldering({ hasPolarised: true, hasValues: true }),
    {
      id: "cell",
      stage: "inspection",
      title: "Lithium cell and its holder, if there is one",
      instruction:
        "Cell out for soldering and for all unpowered checks. Holder polarity against the print; the series diode or resistor is fitted.",
      caution:
        "Never charge, short or heat a lithium cell. A swollen or hot cell goes outdoors onto stone, not into the bin.",
      kind: "statement",
      typed: { expects: "cell out, diode fitted, polarity right" },
    },
    railsToGround([
      { name: "+5 V", atLeast: "200 Ω" },
      { name: "+12 V", atLeast: "500 Ω" },
      { name: "-12 V", atLeast: "500 Ω" },
    ]),
    groundContinuity("every ground pin of the edge connector and of the digital packages"),
    railsApart(["+5 V to +12 V", "+5 V to -12 V", "+12 V to -12 V"]),
    {
      id: "one-ground-joint",
      stage: "continuity",
      title: "Analogue and digital ground meet in one place",
      instruction: "Open the link between them: no other way. Close it: one.",
      kind: "table",
      typed: { columns: ["resistance"], rows: [row("link open", "Ω", "> 1 kΩ"), row("link closed", "Ω", "< 0.5 Ω")] },
      covers: { rails: ["GND", "AGND"] },
    },
    {
      id: "output-off",
      stage: "continuity",
      title: "Outputs are off without a command",
      instruction:
        "At the output terminals, nothing connected: pull-downs and flyback diodes in place, measured in both directions.",
      caution: OUTPUTS_CAUTION,
      holdPoint: true,
      kind: "statement",
      typed: { expects: "pulled off, diodes the right way round" },
    },
    firstPower({
      rail: "+5.0 V, then +12 V and -12 V together",
      limit: "0.15 A each",
      window: "1 … 120 mA",
      needs: ["rails-to-ground", "rails-apart", "polarity", "output-off"],
    }),
    nothingGetsHot(),
    railsWithAndWithoutLoad(RAILS, ["no load", "outputs loaded"]),
    ripple("+12 V", "< 20 mV"),
    {
      id: "reference",
      stage: "function",
      title: "Reference voltage",
      instruction: "At the converter's reference pin, after ten minutes' warming up, with the best meter there is.",
      kind: "reading",
      typed: { unit: "V", limits: "2.5 V ± 0.4 %", expected: "2.500 V" },
      covers: { signals: ["VREF"] },
    },
    {
      id: "clock-reset",
      stage: "function",
      title: "Clock and reset of the digital side",
      instruction: "Clock present at every package that needs it; reset by hand sets the converter to zero.",
      kind: "statement",
      typed: { expects: "clock at every pin, zero after reset" },
      covers: { signals: ["CLK", "RESET_N"] },
    },
    {
      id: "transfer",
      stage: "function",
      title: "Zero, middle and full scale",
      instruction:
        "Code by switches or from the neighbour's connector; output unloaded, then with its real load in a dummy.",
      caution: OUTPUTS_CAUTION,
      holdPoint: true,
      kind: "table",
      typed: {
        columns: ["unloaded", "loaded"],
        rows: [
          row("zero", "V", "-5 … 5 mV"),
          row("middle", "V", "5 V ± 0.2 %"),
          row("full scale", "V", "9.99 V ± 0.2 %"),
        ],
      },
      needs: ["reference"],
    },
    {
      id: "step",
      stage: "function",
      title: "Step at the output",
      instruction:
        "From zero to full scale and back, scope at the output with its load; keep the picture and the data.",
      kind: "capture",
      typed: { expects: "settles without ringing" },
      needs: ["transfer"],
    },
    {
      id: "travel",
      stage: "function",
      title: "First movement, slowly",
      instruction:
        "Output connected to what it moves, travel limited by hand or by the supply's current limit. Smallest step first, then the whole way. End stops work before anything else is tried.",
      caution: OUTPUTS_CAUTION,
      holdPoint: true,
      kind: "statement",
      typed: { expects: "moves the right way, stops at both ends" },
      needs: ["transfer"],
    },
    insertion(),
    railsTogether(RAILS),
    {
      id: "noise",
      stage: "integration",
      title: "Noise at the output with the machine running",
      instruction: "Constant code, all neighbours at full clock: peak to peak at the output over one second.",
      kind: "reading",
      typed: { unit: "V", limits: "< 10 mV", expected: "" },
      needs: ["seated"],
    },
    {
      id: "wiring-picture",
      stage: "integration",
      title: "Cables outside the rack photographed",
      instruction: "Every cable that leaves the card, with its strain relief and its label.",
      kind: "photo",
      typed: { expects: "every cable with its label", minimum: "1" },
      needs: ["seated"],
    },
    soakTest("The outputs working."),
  ],
};
