import { busNames, signalKey, signalKeys } from "../signal-names";
import { readPin, type BoardBook } from "./board-book";
import type { Covers } from "./rework";
import { blockKey, type TouchSet } from "./touch-set";

/** Where what a check covers meets what the rework touches: a sentence for each signal, block and pin, said once. */
export function meetCovers(covers: Covers, touched: TouchSet, book: BoardBook): string[] {
  const met = [
    ...[...covers.signals, ...covers.rails].flatMap((name) => meetSignal(name, touched)),
    ...covers.blocks.flatMap((name) => meetBlock(name, touched)),
    ...covers.pins.flatMap((name) => meetPin(name, touched, book)),
  ];
  const told = new Set<string>();
  return met.flatMap(({ keys, sentence }) => {
    if (keys.every((key) => told.has(key))) return [];
    for (const key of keys) told.add(key);
    return [sentence];
  });
}

type Meeting = { keys: string[]; sentence: string };

const meeting = (keys: string[], covered: string, touches: string): Meeting[] => [
  { keys, sentence: `It covers ${covered}; the rework touches ${touches}.` },
];

/** A range that meets in several lines is one sentence. */
function meetSignal(name: string, { signals }: TouchSet): Meeting[] {
  const keys = signalKeys(name).filter((key) => signals.has(key));
  const [first] = keys;
  if (first === undefined) return [];
  const own = name.trim();
  if (keys.length > 1) return meeting(keys, own, `${keys.length} lines of it`);
  const way = signals.get(first)?.("it") ?? "it";
  return meeting(keys, busNames(own) === undefined ? own : `${first} of ${own}`, way);
}

function meetBlock(name: string, { blocks }: TouchSet): Meeting[] {
  const way = blocks.get(blockKey(name));
  return way === undefined ? [] : meeting([`block ${blockKey(name)}`], `the block ${name.trim()}`, way("it"));
}

function meetPin(text: string, touched: TouchSet, book: BoardBook): Meeting[] {
  const pin = readPin(text);
  if (!pin) return [];
  const { connector, pin: name } = pin;
  const own = text.trim();
  const isTouched =
    connector === undefined
      ? touched.pinNames.has(name)
      : touched.pins.has(`${connector} ${name}`) || touched.pins.has(name);
  const part = connector === undefined ? undefined : touched.parts.get(connector);
  const signal = book.signalsOfPin(pin).find((one) => touched.signals.has(signalKey(one)));
  const keys = [signal === undefined ? `pin ${own}` : signalKey(signal)];
  if (isTouched) return meeting(keys, own, "it");
  if (part !== undefined) return meeting(keys, own, part);
  if (signal === undefined) return [];
  const way = touched.signals.get(signalKey(signal))?.(signal.trim()) ?? signal;
  return meeting(keys, `${own}, which carries ${signal.trim()}`, way);
}
