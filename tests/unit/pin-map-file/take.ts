import { pinNamed } from "@/lib/calc/connector";
import { EMPTY_TEXTS, isEmptyRow, type PinTexts } from "@/lib/pin-map/pin-columns";
import { decodeFile } from "@/lib/pin-map-file/decode-file";
import type { TakeTarget } from "@/lib/pin-map-file/resolve-target";
import { guessColumns } from "@/lib/pin-map-file/guess-columns";
import { judgeRows } from "@/lib/pin-map-file/judge-rows";
import { planTake, type TakePlan } from "@/lib/pin-map-file/plan-take";
import { splitTable } from "@/lib/pin-map-file/split-table";
import { face } from "../../support/face";

export const KNOWN = { families: ["HC", "HCT", "LS"], rails: ["+5V", "-12V"] };

export function target(board: string, reference: string, kept: Record<string, Partial<PinTexts>> = {}): TakeTarget {
  const full = Object.entries(kept).map(([pin, texts]) => [pin, { ...EMPTY_TEXTS, ...texts }] as const);
  return {
    id: `${board}.${reference}`,
    board,
    reference,
    version: 1,
    face: face("din41612-b64"),
    kept: Object.fromEntries(full),
  };
}

const utf8 = (text: string) => new TextEncoder().encode(text);

/** What the page does with a file, from its bytes to what would change. */
export function take(file: string | Uint8Array, targets: readonly TakeTarget[], chosenId: string | null = null) {
  const decoded = decodeFile(typeof file === "string" ? utf8(file) : file);
  if (!decoded.ok) throw new Error(decoded.sentence);
  const split = splitTable(decoded.text);
  if (!split.ok) throw new Error(split.sentence);
  const { table } = split;
  const guess = guessColumns(table, (cell) => targets.some(({ face }) => pinNamed(face, cell)));
  const judged = judgeRows({ table, ...guess, targets, chosenId, known: KNOWN });
  const bad = judged.bad.map(({ line, sentence }) => `${line}: ${sentence}`);
  return {
    ...guess,
    encoding: decoded.encoding,
    delimiter: table.delimiter,
    judged,
    bad,
    plan: planTake(judged.pins, "keep"),
  };
}

/** The pins as they would be afterwards: "a4 PH6 input". */
export const after = ({ targets }: TakePlan): string[] =>
  targets.flatMap(({ changes }) =>
    changes.map(({ pin, after: texts }) => (isEmptyRow(texts) ? `${pin} –` : `${pin} ${texts.signal} ${texts.role}`)),
  );
