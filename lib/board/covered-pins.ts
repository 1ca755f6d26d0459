import { findPin, type Connector } from "@/lib/calc/connector";

export type CoveredPin = { pin: string; checks: string[] };

/** The pins of one connector that checks name, in the connector's order, each with the titles of those checks. */
export function coveredPins(
  connector: Connector,
  reference: string,
  checks: readonly { title: string; pins: readonly string[] }[],
): CoveredPin[] {
  const named = checks.map(({ title, pins }) => ({
    title,
    pins: new Set(pins.flatMap((text) => findPin(connector, reference, text)?.name ?? [])),
  }));
  return connector.pins.flatMap(({ name }) => {
    const titles = named.filter(({ pins }) => pins.has(name)).map(({ title }) => title);
    return titles.length === 0 ? [] : [{ pin: name, checks: titles }];
  });
}
