import type { Connector, ConnectorPin } from "./connector";

export type PinReference = {
  /** Reference of the connector when it was named: "J1" of "J1 a4". */
  connector: string | undefined;
  pin: string;
};

/** A reference designator, then the pin: row letter a … e of a two-part connector and position, or a plain number. */
const PIN = /^(?:((?![a-e]\d)[a-z]{1,3}\d{1,3})[\s.:/-]+)?(?:pin\s+)?([a-e]?\d{1,3})$/i;

/** Reads "J1 a4", "J1-a4", "J1.A4" or plain "a4" as people write a pin; undefined when there is no pin in it. */
export function parsePin(text: string): PinReference | undefined {
  const found = PIN.exec(text.trim());
  const pin = found?.[2];
  return pin === undefined ? undefined : { connector: found?.[1]?.toUpperCase(), pin: pin.toLowerCase() };
}

/** The pin of this connector that the text means; undefined when it names another connector or no pin of this one. */
export function findPin(connector: Connector, reference: string, text: string): ConnectorPin | undefined {
  const parsed = parsePin(text);
  if (!parsed) return undefined;
  if (parsed.connector !== undefined && parsed.connector !== reference.toUpperCase()) return undefined;
  return connector.pins.find((pin) => pin.name === parsed.pin);
}
