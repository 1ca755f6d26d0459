import { type Spread } from "./item";

export type Contacts = { supply: number; ground: number };

export type MachinePowerInput = {
  rails: {
    name: string;
    volts: number;
    tolerancePercent: number;
    /** What the supply gives at most, A; null while nobody knows. */
    capacityA: number | null;
  }[];
  placements: {
    id: string;
    label: string;
    board: string;
    slot: number | null;
    draws: { rail: string; typicalA: number; worstA: number }[];
    heatW: Spread | null;
    /** Contacts of the board for each rail and for ground. */
    contacts: { rail: string; count: number }[];
    groundContacts: number;
  }[];
  /** Of the air at the connectors, °C. */
  ambientC: number;
  /** Along each rail, from the source outwards; see `backplaneDrop`. Rails that are missing are not computed. */
  backplane: BackplaneRail[];
};

/** One rail of the backplane as a line from its source. */
export type BackplaneRail = {
  rail: string;
  /** Ω between one slot and the next, there and back. */
  supplyOhm: number;
  groundOhm: number;
  /** Of one contact, Ω. */
  contactOhm: number;
  /** Slots in the order of the line; the source feeds the first. */
  slots: number[];
};

export type SupplyMargin = {
  rail: string;
  volts: number;
  sum: Spread;
  capacityA: number | null;
  /** Of the capacity, left at worst; null without a capacity. Below zero: too little. */
  leftPercent: number | null;
  verdict: "enough" | "scant" | "too little" | "unknown";
  sentence: string;
};

export type ContactLoad = {
  placement: string;
  label: string;
  /** The rail, or "ground". */
  rail: string;
  contacts: number;
  worstA: number;
  perContactA: number;
  ratedA: number;
  verdict: "fits" | "too much" | "no contact";
  sentence: string;
};

export type SlotDrop = {
  rail: string;
  slot: number;
  placement: string;
  /** Lost on the way there and back, contacts included, V, at worst current. */
  dropV: number;
  /** What is left at the card at the rail's nominal voltage, V. */
  volts: number;
  verdict: "fits" | "too low";
  sentence: string;
};

export type MachinePower = {
  margins: SupplyMargin[];
  contacts: ContactLoad[];
  drops: SlotDrop[];
  heat: { placement: string; label: string; watts: Spread }[];
  heatTotalW: Spread;
};
