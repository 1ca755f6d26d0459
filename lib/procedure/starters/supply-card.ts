import { afterSoldering } from "./after-soldering";
import { firstPower, nothingGetsHot, railsWithAndWithoutLoad, ripple } from "./first-power";
import { row, type Starter } from "./starter";
import { insertion, railsTogether, soakTest } from "./together";
import { groundContinuity, railsApart, railsToGround } from "./unpowered";

const RAILS = [
  { name: "+5 V", limits: "4.75 … 5.25 V" },
  { name: "+12 V", limits: "12 V ± 5 %" },
  { name: "-12 V", limits: "-12.6 … -11.4 V" },
];

const MAINS =
  "This card takes low voltage only. Mains stays inside a certified supply with its cover on; work on it is for a licensed person and under the electrical code of where you are.";

export const supplyCard: Starter = {
  id: "supply-card",
  name: "Power supply card",
  description: "Takes a low voltage from a certified supply and makes or spreads the rails of the machine.",
  checks: [
    ...afterSoldering({ hasPolarised: true, hasValues: true }),
    railsToGround([
      { name: "+5 V", atLeast: "100 Ω" },
      { name: "+12 V", atLeast: "500 Ω" },
      { name: "-12 V", atLeast: "500 Ω" },
    ]),
    groundContinuity("the ground pins of the edge connector, the screw terminals and the heat sink if it is grounded"),
    railsApart(["+5 V to +12 V", "+5 V to -12 V", "+12 V to -12 V"]),
    {
      id: "input-side",
      stage: "continuity",
      title: "Fuse, switch and reverse-polarity protection",
      instruction:
        "Fuse in, switch on, supply not connected: from the input terminal through fuse and switch to the regulator's input. Then the diode test across the protection, both ways.",
      caution: MAINS,
      reference: "Local electrical code; a licensed person where mains is near",
      holdPoint: true,
      kind: "statement",
      typed: { expects: "conducts one way, right fuse fitted" },
    },
    firstPower({
      rail: "the input voltage",
      limit: "0.1 A",
      window: "0.5 … 60 mA",
      needs: ["rails-to-ground", "rails-apart", "input-side", "polarity"],
    }),
    nothingGetsHot(),
    railsWithAndWithoutLoad(RAILS, ["no load", "half load", "full load"]),
    ripple("+5 V", "< 50 mV"),
    {
      id: "turn-on",
      stage: "power-on",
      title: "The rails come up in order and without overshoot",
      instruction:
        "Scope on the three rails, single shot, triggered by the input voltage; 10 ms a division. Switch on, keep the picture. No rail may go above its upper limit on the way.",
      kind: "capture",
      typed: { expects: "three rails rising, no overshoot" },
      covers: { rails: ["+5 V", "+12 V", "-12 V"] },
      needs: ["rail-voltages"],
    },
    {
      id: "current-limit",
      stage: "function",
      title: "Current limit and fold-back of each rail",
      instruction:
        "With an adjustable load, increase the current until the voltage gives way; note the current. Then short the rail for two seconds, remove the short: it must come back by itself.",
      caution:
        "The load and the pass element get very hot. Do not hold the short by hand; use a clip lead and a switch. Large capacitors stay charged after switching off.",
      kind: "table",
      typed: {
        columns: ["limit"],
        rows: [row("+5 V", "A", "1 … 4 A"), row("+12 V", "A", "0.3 … 1.5 A"), row("-12 V", "A", "0.3 … 1.5 A")],
      },
      covers: { rails: ["+5 V", "+12 V", "-12 V"] },
    },
    {
      id: "monitor",
      stage: "function",
      title: "Monitor and power-good line",
      instruction:
        "Lower the input until power-good goes low, raise it again. It must drop before any rail leaves its limits.",
      kind: "statement",
      typed: { expects: "low before the rails leave their limits" },
      covers: { signals: ["PWR_OK"] },
    },
    insertion(),
    railsTogether(RAILS),
    {
      id: "drop",
      stage: "integration",
      title: "Drop along the backplane on +5 V",
      instruction: "From the supply card's pin to the furthest slot's pin with every card in and running.",
      kind: "reading",
      typed: { unit: "V", limits: "< 100 mV", expected: "" },
      covers: { rails: ["+5 V"] },
      needs: ["rails-together"],
    },
    soakTest("Every card in, machine running."),
  ],
};
