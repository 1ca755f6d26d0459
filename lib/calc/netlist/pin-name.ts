import type { NetPoint } from "./netlist";

/** "U1-3"; empty for a point that no part owns. */
export const pinName = ({ part, pin }: Pick<NetPoint, "part" | "pin">): string =>
  part === "" ? "" : pin === "" ? part : `${part}-${pin}`;

/** For looking up: no two pins share it. */
export const pinKey = ({ part, pin }: Pick<NetPoint, "part" | "pin">): string => `${part}\n${pin}`;
