import type { Connector } from "../connector";
import type { Family } from "../levels";

/** What a pin does for its net, in the trade's words; `passive` is copper, a resistor or a plug that only passes on. */
export const PIN_ROLES = [
  "power",
  "ground",
  "push-pull output",
  "three-state output",
  "open-drain output",
  "input",
  "bidirectional",
  "passive",
  "no connection",
] as const;
export type PinRole = (typeof PIN_ROLES)[number];

export const SIGNAL_CLASSES = ["data", "control", "clock", "analogue", "power", "ground"] as const;
export type SignalClass = (typeof SIGNAL_CLASSES)[number];

/** One pin of one connector of a board's design. Pins that are not listed carry nothing. */
export type DesignPin = {
  /** The standard's name: "a4", "17". */
  pin: string;
  /** Pins of one board with the same signal are one piece of copper; empty: joined to nothing. */
  signal: string;
  role: PinRole;
  /** Logic family of what stands behind the pin: "HC", "LS"; empty where there is no logic. */
  family: string;
  /** Inputs of the family that hang on the pin (a driver alone has 0). */
  loads: number;
  /** Outputs of one group are never on at once: the name of the decoder or the select that sees to it. */
  enableGroup: string;
  /** Resistor on this board from the pin to the supply, in Ω. */
  pullUpOhm: number | null;
};

export type DesignConnector = {
  id: string;
  /** As printed on the board: "J1", "X3". */
  reference: string;
  face: Connector;
  pins: DesignPin[];
};

export type BoardDesign = {
  code: string;
  name: string;
  kind: "card" | "backplane";
  connectors: DesignConnector[];
  /** Gates that packing leaves over whose inputs nobody has tied yet; see lib/calc/packing. */
  untiedSpares: { part: string; gates: number; inputs: number; family: string }[];
};

/** One board where it stands in the machine. A design in three slots has three placements. */
export type Placement = {
  id: string;
  /** Code of the design. */
  board: string;
  /** For people: "CON-01", "CON in slot 7". */
  label: string;
  slot: number | null;
};

export type ConnectorAt = { placement: string; connector: string };

/** Two connectors put together, or joined by a cable: pins of the same name meet. */
export type Mating = { from: ConnectorAt; to: ConnectorAt };

export type SignalFacts = {
  name: string;
  class: SignalClass;
  /** Other names that mean the same on another board, agreed on. */
  aliases: string[];
  /** How often it changes level and back, Hz; null when not said. */
  frequencyHz: number | null;
};

export type Rail = {
  /** The signal that carries it: "+5V". */
  name: string;
  volts: number;
  tolerancePercent: number;
};

/** Current that a placement draws from a rail through its connectors, A; below zero for the one that feeds it. */
export type Draw = { placement: string; rail: string; typicalA: number; worstA: number };

export type PlanConditions = {
  /** Of the air at the connectors, °C. */
  ambientC: number;
  /** Supply of the logic, V. */
  logicVolts: number;
  /** The rail the logic runs from and pull-ups go to. */
  logicRail: string;
  /** Of one net from driver to the last receiver: copper and connectors, pF for each connector pin that it touches. */
  pinCapacitancePf: number;
};

export type Machine = {
  boards: BoardDesign[];
  placements: Placement[];
  matings: Mating[];
  signals: SignalFacts[];
  rails: Rail[];
  draws: Draw[];
  families: Family[];
  conditions: PlanConditions;
};
