import type { PinAt } from "@/lib/calc/interconnect";

/** The pin in the editor of its connector. */
export const pinAddress = (project: string, { board, connector, pin }: Pick<PinAt, "board" | "connector" | "pin">) =>
  `/projects/${project}/wiring?connector=${encodeURIComponent(`${board}.${connector}`)}&pin=${encodeURIComponent(pin)}`;

export const netAddress = (project: string, net: string) =>
  `/projects/${project}/wiring/nets?net=${encodeURIComponent(net)}`;
