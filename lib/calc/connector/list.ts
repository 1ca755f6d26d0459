import { header, twoPart, type Connector } from "./connector";

export const CONNECTOR_IDS = [
  "din41612-b64",
  "din41612-c64",
  "din41612-c96",
  "header-2x5",
  "header-2x8",
  "header-2x10",
  "header-2x13",
  "header-2x17",
  "header-2x20",
  "header-2x25",
  "header-2x32",
] as const;

export type ConnectorId = (typeof CONNECTOR_IDS)[number];

const CONNECTORS: Record<ConnectorId, Connector> = {
  "din41612-b64": twoPart("din41612-b64", "DIN 41612, type B, 64 pins (rows a and b)", ["a", "b"], 2),
  "din41612-c64": twoPart("din41612-c64", "DIN 41612, type C, 64 pins (rows a and c)", ["a", "c"], 3),
  "din41612-c96": twoPart("din41612-c96", "DIN 41612, type C, 96 pins (rows a, b and c)", ["a", "b", "c"], 3),
  "header-2x5": header(5),
  "header-2x8": header(8),
  "header-2x10": header(10),
  "header-2x13": header(13),
  "header-2x17": header(17),
  "header-2x20": header(20),
  "header-2x25": header(25),
  "header-2x32": header(32),
};

export function isConnectorId(id: string): id is ConnectorId {
  return Object.hasOwn(CONNECTORS, id);
}

export function findConnector(id: string | null): Connector | undefined {
  return id !== null && isConnectorId(id) ? CONNECTORS[id] : undefined;
}

export const connectorChoices = CONNECTOR_IDS.map((id) => ({ id, label: CONNECTORS[id].label }));
