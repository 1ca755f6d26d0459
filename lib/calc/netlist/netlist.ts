/**
 * What the copper of one board should join. Coordinates in mm from the file's own origin, y away from the reader; angles in
 * degrees, anticlockwise.
 */
export type Netlist = {
  source: "ipc-d-356" | "pin-list" | "pin-map";
  /** In the order in which the file names them; each name once, each with at least one point. */
  nets: Net[];
  /** Pads and holes that belong to no net. */
  unconnected: NetPoint[];
  /** Nets that the file says run beside each other; names of `nets`, each pair once. */
  adjacent: NetPair[];
  /** Edges of the board as drawn in the file; each path is a chain of places. */
  outlines: Outline[];
  /** Holes and marks that carry no net: for fixing, tooling and sighting. */
  toolingHoles: ToolingHole[];
  /**
   * board: as they lie on the board. faces: the board's connectors by their faces, set side by side (pin map).
   * none: no point has coordinates.
   */
  places: "board" | "faces" | "none";
  /** Header of the file: job, title, revision …, in its order. */
  facts: NetlistFact[];
};

export type Net = { name: string; points: NetPoint[] };

/** surface: a pad on one side; through: a hole that a lead goes into; pin: the source does not say how it is made. */
export type PointKind = "through" | "surface" | "via" | "pin";

/** primary: the side of the parts; secondary: the other one; inner: a layer between, out of reach. */
export type Side = "both" | "primary" | "secondary" | "inner";

export type NetPoint = {
  /** "U1", "J3"; empty for a via. */
  part: string;
  pin: string;
  kind: PointKind;
  /** The source marks it as lying between two ends of its net: it need not be probed. */
  isMidPoint: boolean;
  /** From where it can be touched; null when the source does not say. */
  side: Side | null;
  xMm: number | null;
  yMm: number | null;
  /** Null for no hole, or for a diameter that cannot be meant. */
  holeMm: number | null;
  isPlated: boolean | null;
  /** Size of the pad before it is turned; height null: round. */
  padWidthMm: number | null;
  padHeightMm: number | null;
  turnDeg: number | null;
  /** Sides on which solder mask covers it. */
  mask: "none" | "primary" | "secondary" | "both" | null;
  /** Of the source, from 1; 0 where there are no lines. */
  line: number;
};

export type NetPair = { one: string; other: string };

export type Place = { xMm: number; yMm: number };

export type Outline = { kind: "board" | "panel" | "score" | "other"; paths: Place[][] };

export type ToolingHole = Place & { holeMm: number | null; line: number };

export type NetlistFact = { name: string; value: string };
