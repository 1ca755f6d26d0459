/**
 * Connector faces: rows and positions at their true spacing, pins by the standard's own names, the body's outline.
 * Leaves out mixed power contacts, coding, rows d and e of the five-row types, and the height of the parts.
 */
export type ConnectorRow = {
  name: string;
  /** Distance of the row from the first row of the body, in mm. */
  offsetMm: number;
};

export type ConnectorPin = { name: string; row: number; position: number };

export type Connector = {
  id: string;
  /** For lists: "DIN 41612, type C, 64 pins (rows a and c)". */
  label: string;
  rows: ConnectorRow[];
  positions: number;
  pitchMm: number;
  /** Empty rows that the body has but that carry no contact, e.g. row b of a 64-pin type C. */
  bodyRows: number;
  pins: ConnectorPin[];
  /** The body as one sees it from the front; the contacts stand in its middle. */
  outline: { lengthMm: number; widthMm: number };
  /** Connectors with the same word plug together: a 64-pin type C fits a 96-pin one. */
  body: string;
};

export const GRID_MM = 2.54;

/** Whether the two can be put together at all. */
export const canMate = (one: Connector, other: Connector): boolean => one.body === other.body;
