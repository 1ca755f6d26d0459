import { findConnector } from "@/lib/calc/connector";
import type { BoardDesign, DesignPin, Machine, PinRole, SignalFacts } from "@/lib/calc/interconnect";
import { FAMILIES } from "@/lib/calc/levels";

/** Slots on one backplane; more cards stand in further racks of this size. */
const SLOTS_A_RACK = 40;
const BUS_LINES = 48;

/**
 * Racks of 40 slots with 96 pins each, every pin in use: grounds and supplies, a bus of 48 lines through all slots of a
 * rack that a quarter of the cards drive in turn, two clocks from the first slot, open-drain lines, and links from each
 * card to the next. Eleven designs, with a handful of mistakes, as a real plan has them.
 */
export function largeMachine(cards: number): Machine {
  const face = findConnector("din41612-c96");
  if (!face) throw new Error("There is no connector with 96 pins.");
  const names = face.pins.map(({ name }) => name);
  const slots = Math.min(cards, SLOTS_A_RACK);
  const designs = Array.from({ length: 11 }, (_, kind): BoardDesign => ({
    code: `K${kind}`,
    name: `Card ${kind}`,
    kind: "card",
    connectors: [{ id: `K${kind} J1`, reference: "J1", face, pins: names.map((pin, at) => cardPin(pin, at, kind)) }],
    untiedSpares: [],
  }));
  const racks = Array.from({ length: Math.ceil(cards / SLOTS_A_RACK) }, (_, rack): BoardDesign => ({
    code: `B${rack}`,
    name: `Backplane ${rack}`,
    kind: "backplane",
    connectors: Array.from({ length: slots }, (_, slot) => ({
      id: `B${rack} X${slot}`,
      reference: `X${slot}`,
      face,
      pins: names.map((pin, at) => slotPin(pin, at, slot, slots)),
    })),
    untiedSpares: [],
  }));
  const seats = Array.from({ length: cards }, (_, at) => ({
    rack: Math.floor(at / SLOTS_A_RACK),
    slot: at % SLOTS_A_RACK,
    code: at % SLOTS_A_RACK === 0 ? "K10" : `K${at % 10}`,
    id: `card ${at}`,
  }));
  return {
    boards: [...designs, ...racks],
    placements: [
      ...racks.map(({ code }) => ({ id: code, board: code, label: code, slot: null })),
      ...seats.map(({ id, code }, at) => ({ id, board: code, label: `${code}-${at}`, slot: at + 1 })),
    ],
    matings: seats.map(({ id, code, rack, slot }) => ({
      from: { placement: `B${rack}`, connector: `B${rack} X${slot}` },
      to: { placement: id, connector: `${code} J1` },
    })),
    signals: [
      { name: "PHI1", class: "clock", aliases: [], frequencyHz: 4e6 },
      { name: "PHI2", class: "clock", aliases: [], frequencyHz: 4e6 },
      ...wires(slots),
    ],
    rails: [{ name: "+5V", volts: 5, tolerancePercent: 5 }],
    draws: seats.map(({ id }) => ({ placement: id, rail: "+5V", typicalA: 0.4, worstA: 0.8 })),
    families: FAMILIES,
    conditions: { ambientC: 40, logicVolts: 5, logicRail: "+5V", pinCapacitancePf: 5 },
  };
}

/** What stands on each place of the face, whichever board looks at it. */
function lineAt(at: number): { name: string; use: "ground" | "power" | "bus" | "clock" | "open" | "link" } {
  if (at % 12 === 0) return { name: "GND", use: "ground" };
  if (at % 24 === 1) return { name: "+5V", use: "power" };
  if (at === 13 || at === 35) return { name: at === 13 ? "PHI1" : "PHI2", use: "clock" };
  if (at % 32 === 3) return { name: `REQ${at}`, use: "open" };
  if (at < BUS_LINES + 12) return { name: `D${at}`, use: "bus" };
  return isLink(at) ? { name: "", use: "link" } : { name: "GND", use: "ground" };
}

/** Both places of a pair must be free for a link. */
function isLink(at: number): boolean {
  const even = at - (at % 2);
  return [even, even + 1].every((one) => one % 12 !== 0 && one % 24 !== 1 && one % 32 !== 3);
}

/** The wire that begins on an even place of a slot and ends on the next place of the next slot. */
const wire = (at: number, slot: number) => `W${at}S${slot}_`;

const wires = (slots: number): SignalFacts[] =>
  Array.from({ length: 96 }, (_, at) => at)
    .filter((at) => at % 2 === 0 && lineAt(at).use === "link")
    .flatMap((at) =>
      Array.from({ length: slots }, (_, slot) => ({
        name: wire(at, slot),
        class: "data" as const,
        aliases: [`OUT${at}`, `IN${at + 1}`],
        frequencyHz: null,
      })),
    );

const pinOf = (pin: string, signal: string, role: PinRole, more: Partial<DesignPin> = {}): DesignPin => ({
  pin,
  signal,
  role,
  family: "",
  loads: 0,
  enableGroup: "",
  pullUpOhm: null,
  ...more,
});

function cardPin(pin: string, at: number, kind: number): DesignPin {
  const { name, use } = lineAt(at);
  const input = { family: "HCT", loads: 1 };
  if (use === "ground" || use === "power") return pinOf(pin, name, use);
  if (use === "bus") {
    return kind % 4 === 0
      ? pinOf(pin, name, "three-state output", { family: "HC", enableGroup: "SEL" })
      : pinOf(pin, name, "input", input);
  }
  if (use === "clock") {
    return kind === 10 ? pinOf(pin, name, "push-pull output", { family: "AC" }) : pinOf(pin, name, "input", input);
  }
  if (use === "open") return pinOf(pin, name, "open-drain output", { family: "HCT" });
  // A link's even end drives the next card's odd end.
  return at % 2 === 0
    ? pinOf(pin, `OUT${at}`, "push-pull output", { family: kind === 3 ? "LS" : "HC" })
    : pinOf(pin, `IN${at}`, "input", { family: "HC", loads: 1 });
}

function slotPin(pin: string, at: number, slot: number, slots: number): DesignPin {
  const { name, use } = lineAt(at);
  if (use === "ground" || use === "power") return pinOf(pin, name, use);
  if (use === "link")
    return pinOf(pin, at % 2 === 0 ? wire(at, slot) : wire(at - 1, (slot + slots - 1) % slots), "passive");
  return pinOf(pin, name, "passive", use === "open" && slot === 0 ? { pullUpOhm: 2200 } : {});
}
