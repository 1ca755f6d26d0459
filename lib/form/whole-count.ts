import { z } from "zod";

type Bounds = { least?: number; most?: number };

/** A count as people type it, or what is wrong with it. A typographic minus counts as one. */
export function readCount(typed: string, { least = 1, most = 10_000 }: Bounds = {}): number | { message: string } {
  const text = typed.trim().replace(/^−/, "-");
  if (text === "") return { message: "say how many." };
  const value = Number(text.replace(",", "."));
  if (!/^[+-]?\d+([.,]\d+)?$/.test(text) || !Number.isFinite(value))
    return { message: `“${typed.trim()}” is no count.` };
  if (!Number.isInteger(value)) return { message: `${typed.trim()} is no whole number. There is no part of one.` };
  if (value < least) return { message: `${typed.trim()} is too few; at least ${least}.` };
  if (value > most) return { message: `${value} is too many; at most ${most.toLocaleString("en-GB")}.` };
  return value;
}

/** One count that stands alone in a form: 12 in stock. */
export const wholeCount = (what: string, bounds: Bounds = {}) =>
  z.string({ message: `${what}: say how many.` }).transform((typed, context) => {
    const read = readCount(typed, bounds);
    if (typeof read === "number") return read;
    context.addIssue({ code: "custom", message: `${what}: ${read.message}` });
    return z.NEVER;
  });

type CountedRow = { count: string };
type AlsoCheck<Row> = (rows: readonly Row[], say: (index: number, field: string, message: string) => void) => void;

/** Rows with a count each; what is wrong is said beside the row and names it: "Row 2: 1.5 is no whole number." */
export const countedRows = <Row extends CountedRow>(
  row: z.ZodType<Row, Row>,
  most: number,
  alsoCheck?: AlsoCheck<Row>,
) =>
  z
    .array(row)
    .max(most, `At most ${most} rows fit here.`)
    .transform((rows, context) => {
      const say = (index: number, field: string, message: string) =>
        context.addIssue({ code: "custom", path: [index, field], message: `Row ${index + 1}: ${message}` });
      alsoCheck?.(rows, say);
      return rows.map((typed, index) => {
        const read = readCount(typed.count);
        if (typeof read !== "number") say(index, "count", read.message);
        return { ...typed, count: typeof read === "number" ? read : 0 };
      });
    });

/** A row that names nothing, or the same as an earlier one. */
export const namedOnce =
  <Field extends string>(field: Field, what: string): AlsoCheck<Record<Field, string>> =>
  (rows, say) =>
    rows.forEach((row, index) => {
      const first = rows.findIndex((other) => other[field] === row[field]);
      if (row[field] === "") say(index, field, `choose ${what}.`);
      else if (first < index) say(index, field, `it names the same as row ${first + 1}. Put the two counts together.`);
    });
