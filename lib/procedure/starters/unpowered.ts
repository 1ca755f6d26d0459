import { row, type StarterCheck } from "./starter";

type Rail = { name: string; atLeast: string };

/** Resistance of each rail to ground, both ways round: a short shows in both, a junction in one. */
export function railsToGround(rails: readonly Rail[]): StarterCheck {
  return {
    id: "rails-to-ground",
    stage: "continuity",
    title: "Each rail to ground, unpowered, in both directions",
    instruction:
      "Board alone, nothing plugged in. Wait until the reading stands still: capacitors charge from the meter. First red probe on the rail and black on ground, then the other way round. A low reading in both directions is a short; low in one only is a junction, which may be right.",
    caution:
      "No supply connected. A capacitor that was ever charged can hold its charge for hours: discharge it through a resistor, never with a screwdriver.",
    holdPoint: true,
    kind: "table",
    typed: {
      columns: ["red on the rail", "red on ground"],
      rows: rails.map((rail) => row(`${rail.name} to ground`, "Ω", `> ${rail.atLeast}`)),
    },
    covers: { rails: ["GND", ...rails.map((rail) => rail.name)] },
    needs: ["joints"],
  };
}

export function groundContinuity(where: string): StarterCheck {
  return {
    id: "ground",
    stage: "continuity",
    title: "Ground is one piece of copper",
    instruction: `Short the probes and note what the leads have; take it off. Then from the ground test point to ${where}. The worst of them is the reading.`,
    reference: "IPC-9252, in outline",
    kind: "reading",
    typed: { unit: "Ω", limits: "< 0.5 Ω", expected: "0.1 Ω" },
    covers: { rails: ["GND"] },
  };
}

export function railsApart(pairs: readonly string[]): StarterCheck {
  return {
    id: "rails-apart",
    stage: "continuity",
    title: "No rail touches another",
    instruction: "Between each pair, red probe on the first. The lowest steady reading counts.",
    holdPoint: true,
    kind: "table",
    typed: { columns: ["resistance"], rows: pairs.map((pair) => row(pair, "Ω", "> 1 kΩ")) },
    covers: { rails: [...new Set(pairs.flatMap((pair) => pair.split(" to ")))] },
    needs: ["joints"],
  };
}
