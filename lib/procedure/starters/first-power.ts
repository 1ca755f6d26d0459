import { row, type StarterCheck } from "./starter";

export const FIRST_POWER_CAUTION =
  "Bench supply with its current limit set before it is connected; a supply without a limit is not good enough. Glasses on, hands off the board for the first ten seconds. If it smokes, smells or ticks, switch off first and look afterwards.";

export const HOT_CAUTION =
  "Regulators, resistors and shorted parts get hot enough to burn. Hold the back of a finger near before you touch, or use a thermometer.";

/** The first time current flows. What may be recorded afterwards waits for this one. */
export function firstPower(given: { rail: string; limit: string; window: string; needs: string[] }): StarterCheck {
  return {
    id: "first-power",
    stage: "power-on",
    title: "Current at first power",
    instruction: `Set ${given.rail} and a current limit of ${given.limit} with the outputs shorted, then connect the board. Turn the voltage up slowly and watch the current. Stop when it rises faster than the voltage or the limit lamp comes on. Note the current after ten seconds at full voltage.`,
    caution: FIRST_POWER_CAUTION,
    holdPoint: true,
    kind: "reading",
    typed: { unit: "A", limits: given.window, expected: "" },
    covers: { rails: ["GND"] },
    needs: given.needs,
  };
}

export function nothingGetsHot(): StarterCheck {
  return {
    id: "warm-parts",
    stage: "power-on",
    title: "Nothing gets hot that should not",
    instruction:
      "After one minute and again after five: go over the board with a thermometer or the back of a finger held close. Note which parts are warm and how warm.",
    caution: HOT_CAUTION,
    kind: "statement",
    typed: { expects: "no part too hot to touch" },
    needs: ["first-power"],
  };
}

type Rail = { name: string; limits: string };

export function railsWithAndWithoutLoad(rails: readonly Rail[], points: readonly string[]): StarterCheck {
  return {
    id: "rail-voltages",
    stage: "power-on",
    title: `Rails at ${points.join(" and ")}`,
    instruction:
      "Black probe on the ground test point and nowhere else. Measure at the part that is furthest from where the rail comes in, not at the connector.",
    caution: "One slip of the probe between two pins can destroy the part under it. Use hooked or fine tips.",
    kind: "table",
    typed: { columns: [...points], rows: rails.map((rail) => row(rail.name, "V", rail.limits)) },
    covers: { rails: rails.map((rail) => rail.name) },
    needs: ["first-power"],
  };
}

export function ripple(rail: string, limits: string): StarterCheck {
  return {
    id: "ripple",
    stage: "power-on",
    title: `Ripple on ${rail}, peak to peak`,
    instruction:
      "Scope, alternating-current coupling, 20 MHz bandwidth limit, ×10 probe with the short ground spring instead of the long lead. Two time bases: 5 ms a division for the mains side, 1 µs for switching and logic. The larger of the two is the reading.",
    caution: "The ground clip of a scope is earthed. Clip it to ground and nothing else.",
    kind: "reading",
    typed: { unit: "V", limits, expected: "" },
    covers: { rails: [rail] },
    needs: ["rail-voltages"],
  };
}
