import type { Connector, ConnectorPin } from "./connector";

export type PinReference = {
  /** Reference of the connector when it was named: "J1" of "J1 a4". */
  connector: string | undefined;
  /** In small letters, whatever the connector's own writing: "a4", "17", "z". */
  pin: string;
};

/** A reference designator that is not itself a pin, then the pin: row and position, a number, or an edge's letter. */
const NAMED = /^((?![a-e]\d)[a-z]{1,3}\d{1,3})[\s.:/-]+(?:pin\s+)?([a-z]{0,3}\d{1,3}|[a-z])$/i;

/** Without a connector's reference: rows beyond e would be taken for a reference, so only a … e are read. */
const ALONE = /^(?:pin\s+)?([a-e]?\d{1,3}|[a-z])$/i;

/** Reads "J1 a4", "J1-a4", "J1.A4", "X3 Z" or plain "a4" as people write a pin; undefined when no pin is in it. */
export function parsePin(text: string): PinReference | undefined {
  const found = NAMED.exec(text.trim());
  const pin = found?.[2] ?? ALONE.exec(text.trim())?.[1];
  return pin === undefined ? undefined : { connector: found?.[1]?.toUpperCase(), pin: pin.toLowerCase() };
}

const faces = new WeakMap<Connector, Map<string, ConnectorPin>>();

/** The pin of exactly this name, small or capital letters alike. */
export function pinNamed(connector: Connector, name: string): ConnectorPin | undefined {
  let pins = faces.get(connector);
  if (!pins) {
    pins = new Map(connector.pins.map((pin) => [pin.name.toLowerCase(), pin]));
    faces.set(connector, pins);
  }
  return pins.get(name.trim().toLowerCase());
}

/** The pin of this connector that the text means; undefined when it names another connector or no pin of this one. */
export function findPin(connector: Connector, reference: string, text: string): ConnectorPin | undefined {
  const direct = pinNamed(connector, text);
  if (direct) return direct;
  const parsed = parsePin(text);
  if (!parsed || (parsed.connector !== undefined && parsed.connector !== reference.toUpperCase())) return undefined;
  return pinNamed(connector, parsed.pin);
}
