import type { Connector } from "./connector";

/** A face of one's own: rows by name, positions counted from 1, both at one pitch. */
export type ConnectorGrid = { rows: string[]; positions: number; pitchMm: number };

const MOST_ROWS = 26;
const MOST_POSITIONS = 200;
const ROW_NAME = /^[a-z]{1,3}$/i;

/**
 * What is wrong with the grid, a sentence each; empty when it can be drawn. A pin is named row + position ("b7"), so
 * row names are letters only; a single row may stay without a name, then its pins are 1, 2, 3 ….
 */
export function gridProblems({ rows, positions, pitchMm }: ConnectorGrid): string[] {
  const problems: string[] = [];
  if (rows.length === 0 || rows.length > MOST_ROWS) problems.push(`Give the connector 1 to ${MOST_ROWS} rows.`);
  rows.forEach((name, index) => {
    const isOnlyRow = rows.length === 1 && name === "";
    if (!isOnlyRow && !ROW_NAME.test(name)) {
      problems.push(`Row ${index + 1} is called “${name}”. Name a row with one to three letters, such as a.`);
    }
    const first = rows.findIndex((other) => other.toLowerCase() === name.toLowerCase());
    if (first < index) problems.push(`Rows ${first + 1} and ${index + 1} are both called ${name}.`);
  });
  if (!Number.isInteger(positions) || positions < 1 || positions > MOST_POSITIONS) {
    problems.push(`Give each row 1 to ${MOST_POSITIONS} positions.`);
  }
  if (!(pitchMm >= 0.2 && pitchMm <= 50)) problems.push("Give a pitch between 0.2 and 50 mm.");
  return problems;
}

/** The face of a grid; undefined when gridProblems has something to say. */
export function gridFace(grid: ConnectorGrid): Connector | undefined {
  if (gridProblems(grid).length > 0) return undefined;
  const { rows, positions, pitchMm } = grid;
  return {
    id: "grid",
    label: `Own face, ${rows.length} × ${positions}, ${pitchMm} mm`,
    rows: rows.map((name, index) => ({ name, offsetMm: index * pitchMm })),
    positions,
    pitchMm,
    bodyRows: rows.length,
    pins: rows.flatMap((name, row) =>
      Array.from({ length: positions }, (_, at) => ({ name: `${name}${at + 1}`, row, position: at + 1 })),
    ),
    outline: { lengthMm: positions * pitchMm, widthMm: rows.length * pitchMm },
    body: `grid ${rows.join(",").toLowerCase()} × ${positions} at ${pitchMm} mm`,
  };
}
