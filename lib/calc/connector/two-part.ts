import { GRID_MM, type Connector } from "./connector";

/*
 * Two-part connectors of IEC 60603-2 (DIN 41612): grid 2.54 mm, rows a, b, c, positions 1 … 32, half sizes 1 … 16.
 * Outline: the half-size type C is 54 × 11.1 mm at most in a maker's sheet (check-values: half C); the full size is
 * 16 positions longer (computed: 54 + 40.64, rounded to the 95 mm that makers print), type B is narrower by one row
 * (from memory). The standard itself was not opened.
 */
const HALF_LENGTH_MM = 54;
const FULL_LENGTH_MM = 95;
const WIDTH_C_MM = 11.1;

type Size = { type: "B" | "C"; positions: 16 | 32; rowNames: readonly string[] };

/** Rows by letter; each position of each row carries a contact named row letter + position. */
function twoPart(id: string, label: string, { type, positions, rowNames }: Size): Connector {
  const rows = rowNames.map((name) => ({ name, offsetMm: (name.charCodeAt(0) - "a".charCodeAt(0)) * GRID_MM }));
  const pins = rows.flatMap((row, index) =>
    Array.from({ length: positions }, (_, at) => ({ name: `${row.name}${at + 1}`, row: index, position: at + 1 })),
  );
  const isFull = positions === 32;
  return {
    id,
    label: `DIN 41612, type ${label}`,
    rows,
    positions,
    pitchMm: GRID_MM,
    bodyRows: type === "B" ? 2 : 3,
    pins,
    outline: {
      lengthMm: isFull ? FULL_LENGTH_MM : HALF_LENGTH_MM,
      widthMm: type === "B" ? WIDTH_C_MM - GRID_MM : WIDTH_C_MM,
    },
    body: `din41612-${type.toLowerCase()}${isFull ? "" : "/2"}`,
  };
}

const AB = ["a", "b"];
const AC = ["a", "c"];
const ABC = ["a", "b", "c"];

export const TWO_PART = {
  "din41612-b64": twoPart("din41612-b64", "B, 64 pins (rows a and b)", { type: "B", positions: 32, rowNames: AB }),
  "din41612-c64": twoPart("din41612-c64", "C, 64 pins (rows a and c)", { type: "C", positions: 32, rowNames: AC }),
  "din41612-c96": twoPart("din41612-c96", "C, 96 pins (rows a, b and c)", { type: "C", positions: 32, rowNames: ABC }),
  "din41612-b32": twoPart("din41612-b32", "B/2, 32 pins (rows a and b)", { type: "B", positions: 16, rowNames: AB }),
  "din41612-c32": twoPart("din41612-c32", "C/2, 32 pins (rows a and c)", { type: "C", positions: 16, rowNames: AC }),
  "din41612-c48": twoPart("din41612-c48", "C/2, 48 pins (rows a, b and c)", {
    type: "C",
    positions: 16,
    rowNames: ABC,
  }),
};
