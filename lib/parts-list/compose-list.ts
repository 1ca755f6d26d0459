import Papa from "papaparse";
import { priceText } from "@/lib/part/price";
import { escapeCell } from "@/lib/pin-map/cell-escape";
import type { PartsListView } from "./load-parts-list";

/**
 * The list as RFC 4180 has it: a header, CRLF, quotes where they are needed. Formula-looking cells of people are escaped;
 * figures stay figures. A byte order mark makes spreadsheets read Ω and µ as they are.
 */
export function composeList({ boards, board, lines, currency }: PartsListView): string {
  const shown = boards.filter(({ code }) => board === null || code === board);
  const header = [
    "Part",
    "What it is",
    ...shown.map(({ code, units }) => `${code} x ${units}`),
    "Needed",
    "Spares",
    "In stock",
    "To buy",
    `Price of one (${currency})`,
    `Cost (${currency})`,
  ];
  const rows = lines.map((line) => [
    escapeCell(line.part),
    escapeCell(line.description),
    ...shown.map(({ code }) => String(line.perBoard.find((one) => one.code === code)?.total ?? 0)),
    String(line.needed),
    String(line.spares),
    String(line.stock),
    String(line.toBuy),
    line.priceTyped,
    priceText(line.costMinor),
  ]);
  return `\ufeff${Papa.unparse([header.map(escapeCell), ...rows], { newline: "\r\n" })}\r\n`;
}
