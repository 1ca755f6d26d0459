import { signalKeys } from "../signal-names";
import { partKey, readPin, type BoardBook } from "./board-book";
import type { Touched } from "./rework";

/** By way of what a name is touched, in words: "PH6", "J1 a4, which carries PH6", "U7, which PH6 hangs on". */
export type Way = (name: string) => string;

/** All that a rework touches, by the one writing of each name. */
export type TouchSet = {
  signals: ReadonlyMap<string, Way>;
  /** "J1 A4", and "A4" of pins that are named without a connector. */
  pins: ReadonlySet<string>;
  /** "A4": pins of this name on whatever connector. */
  pinNames: ReadonlySet<string>;
  /** As they were written. */
  parts: ReadonlyMap<string, string>;
  blocks: ReadonlyMap<string, Way>;
  remarks: string[];
};

/**
 * Spreads what was named over the board's map: a pin stands for its signal, a part for its pins, signals and blocks, a
 * signal for its agreed other names (one step). Signals and rails share one list of names. The shortest way to a name stays.
 */
export function touchSet(touches: Touched, book: BoardBook): TouchSet {
  const signals = new Map<string, Way>();
  const add = (name: string, way: Way) => {
    for (const key of signalKeys(name)) if (!signals.has(key)) signals.set(key, way);
  };
  const [pins, pinNames, remarks] = [new Set<string>(), new Set<string>(), [] as string[]];
  for (const name of [...touches.signals, ...touches.rails]) add(name, itself);
  for (const text of touches.pins) {
    const pin = readPin(text);
    if (!pin) {
      remarks.push(`“${text.trim()}” is no pin; write it as “J1 a4”.`);
      continue;
    }
    pins.add(pin.connector === undefined ? pin.pin : `${pin.connector} ${pin.pin}`);
    pinNames.add(pin.pin);
    for (const signal of book.signalsOfPin(pin)) add(signal, (name) => `${text.trim()}, which carries ${name}`);
  }
  const parts = new Map(
    touches.parts.filter((part) => partKey(part) !== "").map((part) => [partKey(part), part.trim()]),
  );
  const blocks = new Map<string, Way>();
  const addBlock = (name: string, way: Way) => {
    const key = blockKey(name);
    if (key !== "" && !blocks.has(key)) blocks.set(key, way);
  };
  for (const block of touches.blocks) addBlock(block, itself);
  for (const part of parts.values()) {
    for (const signal of book.signalsOfPart(part)) add(signal, (name) => `${part}, which ${name} hangs on`);
    for (const block of book.blocksOfPart(part)) addBlock(block, (name) => `${part}, which is part of ${name}`);
    if (!book.knowsPart(part)) {
      remarks.push(`What hangs on ${part} is not known: name the signals and blocks that it belongs to.`);
    }
  }
  for (const key of [...signals.keys()]) {
    for (const other of book.otherNames(key))
      if (!signals.has(other)) signals.set(other, (name) => `${key}, another name of ${name}`);
  }
  return { signals, pins, pinNames, parts, blocks, remarks };
}

const itself: Way = (name) => name;

export const blockKey = (name: string): string => name.trim().replace(/\s+/g, " ").toUpperCase();
