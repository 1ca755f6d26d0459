import {
  checkMachine,
  type BoardDesign,
  type DesignPin,
  type Finding,
  type Machine,
  type Mating,
  type PinRole,
} from "@/lib/calc/interconnect";
import { FAMILIES } from "@/lib/calc/levels";
import { face } from "./face";

type Carries = Omit<DesignPin, "pin">;
/** What each pin of a connector carries, by pin. */
export type PinMap = Record<string, Carries>;

export const carries = (signal: string, role: PinRole, more: Partial<Carries> = {}): Carries => ({
  signal,
  role,
  family: role === "power" || role === "ground" || role === "passive" ? "" : "HC",
  loads: role === "input" ? 1 : 0,
  enableGroup: "",
  pullUpOhm: null,
  ...more,
});

export const pushPull = (signal: string, family = "HC") => carries(signal, "push-pull output", { family });
export const threeState = (signal: string, enableGroup = "") => carries(signal, "three-state output", { enableGroup });
export const openDrain = (signal: string, family = "HCT") => carries(signal, "open-drain output", { family });
export const input = (signal: string, family = "HC", loads = 1) => carries(signal, "input", { family, loads });
export const bidirectional = (signal: string, enableGroup = "") =>
  carries(signal, "bidirectional", { enableGroup, loads: 1 });
export const passive = (signal: string) => carries(signal, "passive");
export const power = (signal: string) => carries(signal, "power");
export const ground = (signal = "GND") => carries(signal, "ground");

export function board(
  code: string,
  pins: PinMap,
  kind: BoardDesign["kind"] = "card",
  type = "din41612-c64",
): BoardDesign {
  const connector = {
    id: `${code} J1`,
    reference: "J1",
    face: face(type),
    pins: Object.entries(pins).map(([pin, what]) => ({ pin, ...what })),
  };
  return { code, name: code, kind, connectors: [connector], untiedSpares: [] };
}

export type Rack = {
  cards: Record<string, PinMap>;
  /** Codes from slot 1 on; every card once when left away. */
  slots?: string[];
  /** What a slot of the backplane carries on a pin; a straight bus by the cards' own names when left away. */
  backplane?: (slot: number, pin: string) => string | undefined;
  more?: Partial<Machine>;
};

/** Cards in a backplane: the smallest machine that shows what a rule looks at. */
export function rack({ cards, slots = Object.keys(cards), backplane, more = {} }: Rack): Machine {
  const signalOn = new Map<string, Carries>();
  for (const pins of Object.values(cards)) {
    for (const [pin, what] of Object.entries(pins)) if (!signalOn.has(pin)) signalOn.set(pin, what);
  }
  const slotPins = (slot: number): DesignPin[] =>
    [...signalOn].flatMap(([pin, { signal, role }]) => {
      const name = backplane ? backplane(slot, pin) : signal;
      const own = role === "power" || role === "ground" ? role : "passive";
      return name === undefined ? [] : [{ pin, ...carries(name, own) }];
    });
  const bus: BoardDesign = {
    code: "BPL",
    name: "Backplane",
    kind: "backplane",
    connectors: slots.map((_, at) => ({
      id: `X${at + 1}`,
      reference: `X${at + 1}`,
      face: face("din41612-c64"),
      pins: slotPins(at + 1),
    })),
    untiedSpares: [],
  };
  const placements = slots.map((code, at) => ({
    id: `slot ${at + 1}`,
    board: code,
    label: `${code}-0${slots.slice(0, at + 1).filter((one) => one === code).length}`,
    slot: at + 1,
  }));
  const matings: Mating[] = slots.map((code, at) => ({
    from: { placement: "backplane", connector: `X${at + 1}` },
    to: { placement: `slot ${at + 1}`, connector: `${code} J1` },
  }));
  return {
    boards: [...Object.entries(cards).map(([code, pins]) => board(code, pins)), bus],
    placements: [{ id: "backplane", board: "BPL", label: "BPL-01", slot: null }, ...placements],
    matings,
    signals: [],
    rails: [],
    draws: [],
    families: FAMILIES,
    conditions: { ambientC: 40, logicVolts: 5, logicRail: "+5V", pinCapacitancePf: 5 },
    ...more,
  };
}

export const clock = (name: string) => ({ name, class: "clock" as const, aliases: [], frequencyHz: null });

/** The findings of one rule. */
export const found = (machine: Machine, rule: string): Finding[] =>
  checkMachine(machine).findings.filter((finding) => finding.rule === rule);

/** The one finding of a rule; a machine that shows none or several is not what the test is about. */
export function only(machine: Machine, rule: string): Finding {
  const [first, ...rest] = found(machine, rule);
  if (!first || rest.length > 0) {
    throw new Error(
      `${rest.length + (first ? 1 : 0)} findings of ${rule}: ${[first, ...rest].map((one) => one?.title)}`,
    );
  }
  return first;
}
