import { GRID_MM, type Connector } from "./connector";

/** Lengths of a two-row header that are sold: 2 × 5 … 2 × 32. */
export const HEADER_POSITIONS = [
  5, 6, 7, 8, 9, 10, 11, 12, 13, 14, 15, 16, 17, 18, 19, 20, 21, 22, 23, 24, 25, 26, 27, 28, 29, 30, 31, 32,
] as const;

export type HeaderId = `header-2x${(typeof HEADER_POSITIONS)[number]}`;

/**
 * A 2 × n header on the 2.54 mm grid: odd pins in one row, even pins in the other, counted across; the body ends half
 * a pitch outside the pins. Trade practice, no standard.
 */
export function header(positions: number): Connector {
  const id = `header-2x${positions}`;
  return {
    id,
    label: `Pin header 2 × ${positions}`,
    rows: [
      { name: "odd", offsetMm: 0 },
      { name: "even", offsetMm: GRID_MM },
    ],
    positions,
    pitchMm: GRID_MM,
    bodyRows: 2,
    pins: Array.from({ length: positions * 2 }, (_, index) => ({
      name: String(index + 1),
      row: index % 2,
      position: Math.floor(index / 2) + 1,
    })),
    outline: { lengthMm: positions * GRID_MM, widthMm: 2 * GRID_MM },
    body: id,
  };
}
