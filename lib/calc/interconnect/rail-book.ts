import type { Machine } from "./machine";
import { sortedOnce } from "./order";

/** What is known of supplies and grounds by name. */
export type RailBook = {
  /** Whether the machine lists it as a rail. */
  isListed(name: string): boolean;
  /** Whether the rails, the signals, the name itself or the roles of most of its pins say that it is a supply or a ground. */
  isRail(name: string): boolean;
  isGround(name: string): boolean;
  /** V against ground; undefined when neither the rails nor the name tell. */
  voltsOf(name: string): number | undefined;
};

/** "+5V", "-12V", "+3V3", "5V0A", "3.3V": sign, volts, tenths after the V or a decimal mark. */
const VOLTS_IN_NAME = /^([+\u2212-]?)(\d+(?:[.,]\d+)?)V(\d*)/i;

export function railBook({ rails, signals, boards }: Machine): RailBook {
  const listed = new Map(sortedOnce(rails, (rail) => rail.name).map((rail) => [rail.name, rail.volts]));
  const classOf = new Map(sortedOnce(signals, (signal) => signal.name).map((signal) => [signal.name, signal.class]));
  const roles = new Map<string, { power: number; ground: number; other: number }>();
  for (const { connectors } of boards) {
    for (const { pins } of connectors) {
      for (const { role, signal } of pins) {
        if (role === "passive" || role === "no connection") continue;
        const count = roles.get(signal.trim()) ?? { power: 0, ground: 0, other: 0 };
        count[role === "power" || role === "ground" ? role : "other"] += 1;
        roles.set(signal.trim(), count);
      }
    }
  }
  const isGround = (name: string): boolean => {
    const known = classOf.get(name);
    if (known === "ground" || known === "power" || listed.has(name)) return known === "ground";
    const { power, ground, other } = roles.get(name) ?? { power: 0, ground: 0, other: 0 };
    return ground > power && ground > other;
  };
  const voltsOf = (name: string) => listed.get(name) ?? (isGround(name) ? 0 : voltsInName(name));
  return {
    isListed: (name) => listed.has(name),
    isRail: (name) => {
      if (name === "") return false;
      const known = classOf.get(name);
      if (known === "power" || known === "ground" || voltsOf(name) !== undefined) return true;
      const { power, ground, other } = roles.get(name) ?? { power: 0, ground: 0, other: 0 };
      return power + ground > other;
    },
    isGround,
    voltsOf,
  };
}

function voltsInName(name: string): number | undefined {
  const found = VOLTS_IN_NAME.exec(name);
  if (!found) return undefined;
  const [, sign = "", whole = "", tenths = ""] = found;
  const size = Number(`${whole.replace(",", ".")}${tenths === "" ? "" : `.${tenths}`}`);
  return Number.isNaN(size) ? undefined : (sign === "" || sign === "+" ? 1 : -1) * size;
}
