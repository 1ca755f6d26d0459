import { parseQuantity, type Unit } from "@/lib/calc/units";

type Bounds = {
  /** In the base unit. */
  least?: number;
  most: number;
  /** How a figure of this kind is written: "22 pF". */
  example: string;
};
type ReadFigure = { ok: true; value: number | null } | { ok: false; message: string };

/**
 * A figure as people write it, in the base unit; null when nothing is typed. A figure far beyond its kind is most often
 * one without its prefix ("22" for 22 pF), so the sentence says how to write it.
 */
export function readFigure(typed: string, unit: Unit, { least = 0, most, example }: Bounds): ReadFigure {
  if (typed.trim() === "") return { ok: true, value: null };
  const read = parseQuantity(typed, unit);
  if (!read.ok) return { ok: false, message: read.message };
  const { value } = read.value;
  if (value > most) return { ok: false, message: `${typed.trim()} is far too much. Write it such as ${example}.` };
  if (value < least) return { ok: false, message: `${typed.trim()} is too little. Write it such as ${example}.` };
  return { ok: true, value };
}
