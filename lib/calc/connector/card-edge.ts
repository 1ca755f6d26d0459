import { GRID_MM, type Connector } from "./connector";

/*
 * Card edges: contacts on both faces of the card, facing each other. Names and pitches are trade practice, no standard;
 * the distance of the two rows where they are soldered and the ends of the body are from memory.
 */
const ROWS_APART_MM = 5.08;
const BODY_WIDTH_MM = 9;

type Edge = { label: string; sides: [string, string]; names: [string[], string[]]; pitchMm: number; endsMm: number };

function cardEdge(id: string, { label, sides, names, pitchMm, endsMm }: Edge): Connector {
  const positions = names[0].length;
  return {
    id,
    label,
    rows: sides.map((name, row) => ({ name, offsetMm: row * ROWS_APART_MM })),
    positions,
    pitchMm,
    bodyRows: 2,
    pins: names.flatMap((side, row) => side.map((name, at) => ({ name, row, position: at + 1 }))),
    outline: { lengthMm: (positions - 1) * pitchMm + 2 * endsMm, widthMm: BODY_WIDTH_MM },
    body: id,
  };
}

const counted = (prefix: string, count: number) => Array.from({ length: count }, (_, at) => `${prefix}${at + 1}`);

/** Letters that cannot be taken for a figure or for each other: without G, I, O and Q. */
const EDGE_LETTERS = [..."ABCDEFHJKLMNPRSTUVWXYZ"];

export const CARD_EDGE = {
  "edge-2x22": cardEdge("edge-2x22", {
    label: "Card edge 2 × 22, 3.96 mm (1 … 22, A … Z)",
    sides: ["component side", "solder side"],
    names: [counted("", 22), EDGE_LETTERS],
    pitchMm: 3.96,
    endsMm: 4,
  }),
  "edge-2x31": cardEdge("edge-2x31", {
    label: "Card edge 2 × 31, 2.54 mm (A1 … A31, B1 … B31)",
    sides: ["A", "B"],
    names: [counted("A", 31), counted("B", 31)],
    pitchMm: GRID_MM,
    endsMm: 4,
  }),
};
