import { parsePin } from "../connector";
import { signalKey } from "../signal-names";
import type { BoardMap } from "./rework";

/** A pin as it is compared: "J1 A4"; without a connector it is that pin of every connector. */
export type PinName = { connector: string | undefined; pin: string };

/** One board's map, looked up by the one writing of each name. */
export type BoardBook = {
  /** Signals behind a pin, as the map writes them. */
  signalsOfPin(pin: PinName): string[];
  /** Of its own pins and of the netlist. */
  signalsOfPart(part: string): string[];
  blocksOfPart(part: string): string[];
  knowsPart(part: string): boolean;
  /** Agreed other names; in both directions, one step. */
  otherNames(key: string): string[];
};

/** Undefined when no pin is in the text. */
export function readPin(text: string): PinName | undefined {
  const found = parsePin(text);
  return found && { connector: found.connector, pin: found.pin.toUpperCase() };
}

export const partKey = (part: string): string => part.trim().toUpperCase();

export function boardBook({ pins, parts, aliases }: BoardMap): BoardBook {
  const named = pins.flatMap(({ connector, pin, signal }) =>
    signal.trim() === "" ? [] : [{ connector: partKey(connector), pin: partKey(pin), signal }],
  );
  const byPin = groupBy(named, ({ pin }) => pin);
  const byConnector = groupBy(named, ({ connector }) => connector);
  const byPart = groupBy(parts, ({ part }) => partKey(part));
  const others = new Map<string, string[]>();
  for (const { name, aliases: also } of aliases) {
    for (const alias of also) {
      push(others, signalKey(name), signalKey(alias));
      push(others, signalKey(alias), signalKey(name));
    }
  }
  return {
    signalsOfPin: ({ connector, pin }) =>
      (byPin.get(pin) ?? []).flatMap((one) =>
        connector === undefined || one.connector === connector ? [one.signal] : [],
      ),
    signalsOfPart: (part) => [
      ...(byConnector.get(partKey(part)) ?? []).map(({ signal }) => signal),
      ...(byPart.get(partKey(part)) ?? []).flatMap(({ signals }) => signals),
    ],
    blocksOfPart: (part) => (byPart.get(partKey(part)) ?? []).flatMap(({ blocks }) => blocks),
    knowsPart: (part) => byPart.has(partKey(part)) || byConnector.has(partKey(part)),
    otherNames: (key) => others.get(key) ?? [],
  };
}

export const EMPTY_BOOK = boardBook({ board: "", pins: [], parts: [], aliases: [] });

function groupBy<T>(list: readonly T[], keyOf: (item: T) => string): Map<string, T[]> {
  const groups = new Map<string, T[]>();
  for (const item of list) push(groups, keyOf(item), item);
  return groups;
}

function push<T>(map: Map<string, T[]>, key: string, value: T): void {
  const list = map.get(key);
  if (list) list.push(value);
  else map.set(key, [value]);
}
