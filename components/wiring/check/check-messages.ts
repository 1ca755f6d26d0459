import type { DesignPin, Machine, MachineCheck } from "@/lib/calc/interconnect";

/** Pins as they stand in the editor, by connector; only connectors with unsaved changes. */
export type ChangedPins = Readonly<Record<string, DesignPin[]>>;

/** The machine goes over once; after that only what is typed. */
export type ToChecker = { kind: "machine"; machine: Machine } | { kind: "check"; run: number; pins: ChangedPins };
export type FromChecker = { run: number; check: MachineCheck };
