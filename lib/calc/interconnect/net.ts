import type { PinAt } from "./finding";
import type { BoardDesign, DesignPin } from "./machine";

/** A pin of a net with what its board says of it. */
export type NetPin = PinAt &
  Omit<DesignPin, "pin" | "signal"> & {
    kind: BoardDesign["kind"];
    slot: number | null;
    /** Whether the connector meets another one whose pins are listed; otherwise what lies beyond is unknown. */
    isMated: boolean;
  };

/** The copper that joins pins through all boards and connectors of the assembled machine. */
export type Net = {
  /** The name where only one net has it, with the first pin where several do; never an id of a row. */
  id: string;
  /** What most boards call it; empty when no board names it. */
  name: string;
  /** All names, in natural order. */
  names: string[];
  /** By placement, connector and place on the face. */
  pins: NetPin[];
  /** Ids of the placements that it touches. */
  placements: string[];
};
