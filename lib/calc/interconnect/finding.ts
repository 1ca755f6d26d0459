import type { DesignPin } from "./machine";

/** must: boards will be damaged or will not work; should: may work, not surely; look: worth a look, often intended. */
export type Weight = "must" | "should" | "look";

/** A pin where it stands in the machine. */
export type PinAt = {
  placement: string;
  /** The placement's words for people. */
  label: string;
  board: string;
  /** Reference of the connector: "J1". */
  connector: string;
  connectorId: string;
  pin: string;
  signal: string;
};

/** One change to the design that does what the mend says; all edits of a mend together remove the finding. */
export type Edit =
  | { kind: "pin"; board: string; connectorId: string; pin: string; set: Partial<Omit<DesignPin, "pin">> }
  | { kind: "alias"; signal: string; alias: string }
  | { kind: "tie-spares"; board: string };

export type Finding = {
  /** Stays the same while the finding is about the same thing: rule, net and boards, never order or ids of rows. */
  key: string;
  rule: string;
  weight: Weight;
  /** "Two push-pull outputs drive PH6". */
  title: string;
  /** Why it matters, with the figures: "An LS output gives 2.7 V at worst; the HC input wants 3.15 V." */
  why: string;
  /** What to do about it. */
  mend: string;
  /** Empty when no change to the pin map alone would do. */
  edits: Edit[];
  pins: PinAt[];
  /** Codes of the boards concerned. */
  boards: string[];
  /** What the finding rests upon, in one line; an acceptance ends when it changes. */
  facts: string;
};
