import { CARD_EDGE } from "./card-edge";
import type { Connector } from "./connector";
import { gridFace, type ConnectorGrid } from "./grid";
import { header, HEADER_POSITIONS, type HeaderId } from "./header";
import { TWO_PART } from "./two-part";

export type ConnectorId = keyof typeof TWO_PART | keyof typeof CARD_EDGE | HeaderId;

const HEADER_IDS = HEADER_POSITIONS.map((positions): HeaderId => `header-2x${positions}`);

/** In the order in which they are offered. */
export const CONNECTOR_IDS: readonly ConnectorId[] = [
  "din41612-b64",
  "din41612-c64",
  "din41612-c96",
  "din41612-b32",
  "din41612-c32",
  "din41612-c48",
  ...HEADER_IDS,
  "edge-2x22",
  "edge-2x31",
];

const CONNECTORS = new Map<string, Connector>(
  [...Object.values(TWO_PART), ...HEADER_POSITIONS.map(header), ...Object.values(CARD_EDGE)].map((one) => [
    one.id,
    one,
  ]),
);

export const isConnectorId = (id: string): id is ConnectorId => CONNECTORS.has(id);

export const findConnector = (id: string | null): Connector | undefined =>
  id === null ? undefined : CONNECTORS.get(id);

/** The face of a connector as it is kept: one of the list, or "grid" with its rows; undefined when there is none. */
export const faceOf = ({ type, grid }: { type: string; grid: ConnectorGrid | null }): Connector | undefined =>
  type === "grid" ? (grid === null ? undefined : gridFace(grid)) : findConnector(type);

export const connectorChoices = CONNECTOR_IDS.map((id) => ({ id, label: CONNECTORS.get(id)?.label ?? id }));
