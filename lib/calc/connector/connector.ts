/**
 * Connector faces for the drawing: rows and positions at their true spacing, pins by the standard's own names.
 * Sources: IEC 60603-2 (two-part connectors, 2.54 mm grid: rows a, b, c; positions 1 … 32) for the card edge;
 * 2.54 mm pin headers count 1, 2 / 3, 4 / … across the two rows by trade practice (no standard).
 * Leaves out the mating side's mirroring, the half-length types and mixed power contacts.
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
};

export const GRID_MM = 2.54;

/** A part of IEC 60603-2: rows by letter; each position of each row carries a contact named row letter + position. */
export function twoPart(
  id: string,
  label: string,
  rowNames: readonly string[],
  bodyRows: number,
  positions = 32,
): Connector {
  const rows = rowNames.map((name) => ({ name, offsetMm: (name.charCodeAt(0) - "a".charCodeAt(0)) * GRID_MM }));
  const pins = rows.flatMap((row, index) =>
    Array.from({ length: positions }, (_, at) => ({ name: `${row.name}${at + 1}`, row: index, position: at + 1 })),
  );
  return { id, label, rows, positions, pitchMm: GRID_MM, bodyRows, pins };
}

/** A 2 × n header: odd pins in one row, even pins in the other, counted across. */
export function header(positions: number): Connector {
  const rows = [
    { name: "odd", offsetMm: 0 },
    { name: "even", offsetMm: GRID_MM },
  ];
  const pins = Array.from({ length: positions * 2 }, (_, index) => ({
    name: String(index + 1),
    row: index % 2,
    position: Math.floor(index / 2) + 1,
  }));
  return {
    id: `header-2x${positions}`,
    label: `Pin header 2 × ${positions}`,
    rows,
    positions,
    pitchMm: GRID_MM,
    bodyRows: 2,
    pins,
  };
}

/** The name of the pin in a row, counted from 0, at a position; empty where the connector has none. */
export const pinAt = (connector: Connector, row: number, position: number): string =>
  connector.pins.find((pin) => pin.row === row && pin.position === position)?.name ?? "";
