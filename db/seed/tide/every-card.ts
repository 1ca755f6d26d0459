import { ESD, FIRST_POWER, LENS, type CheckLine } from "./check-line";

/** What every soldered card is looked at for. */
export function inspection(parts: string, polarised: string): CheckLine[] {
  return [
    {
      id: "joints",
      stage: "inspection",
      title: `All joints of ${parts} under the lens`,
      instruction: "Go row by row at ×10. Every joint wets pad and lead, no bridge, no ball, no lifted pad.",
      caution: ESD,
      reference: LENS,
      expect: { kind: "statement" },
    },
    {
      id: "polarity",
      stage: "inspection",
      title: "Every polarised part the right way round",
      instruction: `Compare ${polarised} with the assembly drawing, one after the other.`,
      reference: LENS,
      expect: { kind: "photo", subject: "component side, whole board" },
    },
    {
      id: "values",
      stage: "inspection",
      title: "Part numbers and values as in the parts list",
      instruction: "Read every marking aloud and tick it in the parts list. Note each substitute.",
      expect: { kind: "statement" },
    },
    {
      id: "solder-side",
      stage: "inspection",
      title: "Solder side clean, no lead longer than 1.5 mm",
      instruction: "Wash off flux, cut long leads, look again against the light.",
      reference: LENS,
      expect: { kind: "photo", subject: "solder side, whole board" },
    },
  ];
}

/** "−12 V" as the pin map writes it: -12V. */
const netName = (rail: string) => rail.replace("−", "-").replace(" ", "");

/** Unpowered: ground everywhere, no rail shorted, before anything gets power. */
export function unpowered(rails: { name: string; pins: string[]; forward: string; reverse: string }[]): CheckLine[] {
  return [
    {
      id: "ground",
      stage: "continuity",
      title: "Ground, all ground pins of J1 to TP1",
      instruction: "Black probe on TP1. Touch a1, a32, b1 and b32 of J1 in turn and take the highest reading.",
      caution: "Board out of the rack and unpowered. Discharge C1 first.",
      pins: ["J1 a1", "J1 a32", "J1 b1", "J1 b32"],
      signals: ["GND"],
      rails: ["GND"],
      hold: true,
      expect: { kind: "reading", quantity: "Resistance", limits: "< 0.5 Ω", expected: "0.1 Ω" },
    },
    ...rails.flatMap((rail): CheckLine[] => [
      {
        id: `${rail.name}-forward`,
        stage: "continuity",
        title: `${rail.name} to ground, red on the rail`,
        instruction: `Black probe on TP1, red probe on ${rail.pins[0] ?? "the rail"}. Wait until the reading stands.`,
        caution: "Board unpowered and out of the rack.",
        pins: rail.pins,
        signals: [netName(rail.name)],
        rails: [netName(rail.name)],
        hold: true,
        expect: { kind: "reading", quantity: "Resistance", limits: rail.forward },
      },
      {
        id: `${rail.name}-reverse`,
        stage: "continuity",
        title: `${rail.name} to ground, probes swapped`,
        instruction: `Red probe on TP1, black probe on ${rail.pins[0] ?? "the rail"}. A large difference between the directions is a reversed part.`,
        pins: rail.pins,
        signals: [netName(rail.name)],
        rails: [netName(rail.name)],
        expect: { kind: "reading", quantity: "Resistance", limits: rail.reverse },
      },
    ]),
  ];
}

/** First power on the bench supply, alone, behind a current limit. */
export function firstPower(limitText: string, window: string, expected: string): CheckLine {
  return {
    id: "first-power",
    stage: "power-on",
    title: `Current at first power, limit ${limitText}`,
    instruction: `Bench supply at 5.0 V, current limit ${limitText}, card on the extender, nothing else in the rack. Read the supply's ammeter after ten seconds.`,
    caution: FIRST_POWER,
    rails: ["+5V"],
    hold: true,
    expect: { kind: "reading", quantity: "Current", limits: window, expected },
  };
}

/** The rail at the packages furthest from each other. */
export function railAt(packages: string[], expected: string, how: string): CheckLine {
  return {
    id: "rail",
    stage: "power-on",
    title: `+5 V at ${packages.slice(0, -1).join(", ")} and ${packages.at(-1)}`,
    instruction: `${how}Black probe on TP1, red probe on the supply pin of each package.`,
    rails: ["+5V"],
    expect: { kind: "table", rows: [{ label: "+5 V", limits: "4.75 … 5.25 V", expected }], columns: packages },
  };
}

/** Two looks at a card under power that go together: is a part hot, is the rail quiet. */
export const WARM_AND_QUIET: CheckLine[] = [
  {
    id: "warm",
    stage: "power-on",
    title: "No part warmer than the hand bears after ten minutes",
    instruction: "Back of a finger on every package in turn.",
    caution: "A shorted part burns skin. Come near slowly and switch off if you feel heat before you touch.",
    expect: { kind: "statement" },
  },
  {
    id: "noise",
    stage: "power-on",
    title: "Noise on +5 V at U6",
    instruction: "Scope with the ground spring at C6, full bandwidth, peak to peak.",
    rails: ["+5V"],
    expect: { kind: "reading", quantity: "Noise", limits: "< 120 mV", expected: "60 mV" },
  },
];
