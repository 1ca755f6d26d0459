/** Of one netlist against a later one. Pins are "U1-3"; vias have no name and are not compared. */
export type NetlistDifference = {
  /** Nets of the later one only. */
  gained: string[];
  lost: string[];
  /** The same pins under another name. */
  renamed: { from: string; to: string }[];
  /** Pins of both that change their net; null: belongs to no net. A renamed net moves no pin. */
  moved: { pin: string; from: string | null; to: string | null }[];
  pinsGained: { pin: string; net: string | null }[];
  pinsLost: { pin: string; net: string | null }[];
};
