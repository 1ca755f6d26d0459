import { judgeReading, worstVerdict } from "../judge-reading";
import type { Judged, JudgeContext, JudgedReading } from "../kind";
import type { Entry, Spec } from "./schema";

const cellName = (row: string, column: string) => `${row}, ${column}`;

/** Every cell is a reading with its own verdict; the table's verdict is that of its worst cell. */
export function judge(spec: Spec, entry: Entry, context: JudgeContext): Judged {
  if (entry.cells.length > spec.rows.length || entry.cells.some((row) => row.length > spec.columns.length)) {
    return { ok: false, message: "There are more cells than the table has. Reload the page." };
  }
  const readings: JudgedReading[] = [];
  const sentences: string[] = [];
  const fields: Record<string, string> = {};
  spec.rows.forEach((row, r) => {
    spec.columns.forEach((column, c) => {
      const label = cellName(row.label, column);
      const limits = row.cells[c] ?? row.limits;
      const one = judgeReading({ label, typed: entry.cells[r]?.[c] ?? "", unit: row.unit, limits }, context);
      if (!one.ok) {
        fields[`cells.${r}.${c}`] = one.message;
      } else {
        readings.push(one.reading);
        if (one.reading.verdict !== "conforms")
          sentences.push(...one.sentences.map((sentence) => `${label}: ${sentence}`));
      }
    });
  });
  const open = Object.keys(fields).length;
  if (open > 0)
    return {
      ok: false,
      message: open === 1 ? "One cell is not a reading yet." : `${open} cells are not readings yet.`,
      fields,
    };
  return { ok: true, verdict: worstVerdict(readings), readings, sentences: [count(readings), ...sentences] };
}

function count(readings: JudgedReading[]): string {
  const conforming = readings.filter((reading) => reading.verdict !== "does-not-conform").length;
  return conforming === readings.length
    ? `All ${readings.length} readings conform.`
    : `${conforming} of ${readings.length} readings conform.`;
}
