import { judge, pickRange, type AccuracyRange } from "@/lib/calc/conformity";
import { isUnit, parseQuantity, type Unit } from "@/lib/calc/units";
import type { InstrumentRange } from "@/db/schema/people";
import type { Verdict } from "@/db/schema/travelers";
import type { JudgeContext, JudgedReading } from "./kind";
import type { TypedLimits } from "./typed-limits";

type Asked = { label: string; typed: string; unit: Unit; limits: TypedLimits };
export type OneReading = { ok: true; reading: JudgedReading; sentences: string[] } | { ok: false; message: string };

/** Reads one figure and judges it by its limits, the instrument's accuracy and the project's decision rule. */
export function judgeReading({ label, typed, unit, limits }: Asked, context: JudgeContext): OneReading {
  const text = typed.trim();
  if (text === "") return { ok: false, message: "Enter the reading." };
  const parsed = parseQuantity(text, unit);
  if (!parsed.ok) return { ok: false, message: parsed.message };
  const accuracy = pickRange(accuracyRanges(context.instrumentRanges), parsed.value);
  const judged = judge({
    reading: parsed.value,
    limits: limits.value,
    rule: context.rule,
    ...(accuracy ? { accuracy } : {}),
  });
  const reading = {
    label,
    typed: text,
    value: parsed.value.value,
    unit,
    lower: limits.value.lower ?? null,
    upper: limits.value.upper ?? null,
    expandedUncertainty: judged.expandedUncertainty ?? null,
    verdict: judged.verdict,
  };
  return { ok: true, reading, sentences: judged.sentences };
}

/** Ranges of units that the calculations do not know judge nothing. */
function accuracyRanges(ranges: readonly InstrumentRange[]): AccuracyRange[] {
  return ranges.flatMap(({ unit, ...range }) => (isUnit(unit) ? [{ ...range, unit }] : []));
}

const ORDER: readonly Verdict[] = ["conforms", "guard-band", "does-not-conform"];

export function worstVerdict(readings: readonly JudgedReading[]): Verdict {
  return readings.reduce<Verdict>(
    (worst, { verdict }) => (ORDER.indexOf(verdict) > ORDER.indexOf(worst) ? verdict : worst),
    "conforms",
  );
}
