import type { TableText } from "@/components/wiring/grid/table-text";
import { EMPTY_TEXTS, type PinTexts } from "@/lib/pin-map/pin-columns";

/** A table of one connector with the given rows; the others are empty. */
export function table(pins: readonly string[], kept: Record<string, Partial<PinTexts>> = {}): TableText {
  const rows = pins.map((pin) => ({ connectorId: "J1", pin }));
  return {
    rows,
    textsAt: (row) => ({ ...EMPTY_TEXTS, ...kept[pins[row] ?? ""] }),
    labelAt: (row) => pins[row] ?? "",
    rowNamed: (text) => {
      const found = pins.indexOf(text.trim().toLowerCase());
      return found < 0 ? undefined : found;
    },
  };
}

export const pinsOf = (row: string, count: number): string[] =>
  Array.from({ length: count }, (_, index) => `${row}${index + 1}`);
