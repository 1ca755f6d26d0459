import { type RailSupply, type Spread } from "./item";

export type PoweredPlacement = {
  id: string;
  label: string;
  board: string;
  slot: number | null;
  /** From rails that come to it through its connector; see `boardPower`. */
  draws: { rail: string; typicalA: number; worstA: number }[];
  heatW: Spread | null;
  /** Contacts of its connectors by rail, and for ground; null: the pin map is not known. */
  contacts: { rails: { rail: string; count: number }[]; ground: number } | null;
};

export type MachineRail = RailSupply & {
  /** What the supply gives at most, A; null while nobody knows. */
  capacityA: number | null;
  /** The placement that feeds the rail into the machine; null: wired to the backplane itself. */
  sourcePlacement: string | null;
};

/** One rail of the backplane as a conductor along the slots. */
export type BackplaneRail = {
  rail: string;
  /** Between two neighbouring slots, Ω. */
  supplyOhm: number;
  groundOhm: number;
  /** Of one contact, Ω. */
  contactOhm: number;
  /** Where the rail is fed. 0 feeds before slot 1. */
  sourceSlot: number;
};

export type MachinePowerInput = {
  rails: MachineRail[];
  placements: PoweredPlacement[];
  /** Of the air at the connectors, °C. */
  ambientC: number;
  /** Rails that are missing here get no drop. */
  backplane: BackplaneRail[];
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
  /** Null without a contact. */
  perContactA: number | null;
  /** What one contact bears at the ambient temperature. */
  ratedA: number;
  verdict: "fits" | "too much" | "no contact";
  sentence: string;
};

export type SlotDrop = {
  rail: string;
  slot: number;
  placement: string;
  label: string;
  /** Lost on the way there and back, contacts included, V, at worst current. */
  dropV: number;
  /** What is left at the card where the supply gives its nominal voltage, V. */
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
