import { row, type StarterCheck } from "./starter";

export const OUTPUTS_CAUTION =
  "Motors, relays, solenoids and pens can move at power-up before the logic decides anything. Unplug them, or keep fingers and cables clear and a hand on the switch.";

/** Into the machine, with neighbours that are proven already. */
export function insertion(): StarterCheck {
  return {
    id: "seated",
    stage: "integration",
    title: "In its slot, machine switched off",
    instruction:
      "Only cards whose own function stage holds are in the machine. Check the slot against the drawing, look at the pins of both connectors, push the card home without rocking it, and measure each rail of the backplane to ground once more.",
    caution: "Never plug or pull a card while the machine has power. Wait until the rails have discharged.",
    holdPoint: true,
    kind: "statement",
    typed: { expects: "right slot, no bent pin, no short" },
  };
}

export function railsTogether(rails: readonly { name: string; limits: string }[]): StarterCheck {
  return {
    id: "rails-together",
    stage: "integration",
    title: "Rails with the neighbours",
    instruction: "At this card and at the card furthest from the supply, everything running.",
    kind: "table",
    typed: {
      columns: ["at this card", "at the furthest card"],
      rows: rails.map((rail) => row(rail.name, "V", rail.limits)),
    },
    covers: { rails: rails.map((rail) => rail.name) },
    needs: ["seated"],
  };
}

export function soakTest(what: string): StarterCheck {
  return {
    id: "hour",
    stage: "integration",
    title: "One hour together",
    instruction: `${what} Look at the current, the warmest part and the outputs at the start and after an hour. Stay in the room.`,
    caution: OUTPUTS_CAUTION,
    kind: "statement",
    typed: { expects: "no error, no drift, nothing hot" },
    needs: ["seated"],
  };
}
