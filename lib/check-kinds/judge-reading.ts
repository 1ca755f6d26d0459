import { judge, pickRange } from "@/lib/calc/conformity";
import { parseQuantity } from "@/lib/calc/units";
import type { Verdict } from "@/db/schema/travelers";
import type { JudgeContext, JudgedReading } from "./kind";
import { limitsOf } from "./limits-of";
import type { TypedLimits } from "./typed-limits";

const LONGEST = 60;

type Asked = { label: string; typed: string; unit: string; limits: TypedLimits };
export type OneReading = { ok: true; reading: JudgedReading; sentences: string[] } | { ok: false; message: string };

/** Reads one figure and judges it by its limits, the instrument's accuracy and the project's decision rule. */
export function judgeReading({ label, typed, unit, limits }: Asked, context: JudgeContext): OneReading {
  const text = typed.trim();
  if (text === "") return { ok: false, message: "Enter the reading." };
  if (text.length > LONGEST) return { ok: false, message: `A reading has at most ${LONGEST} characters.` };
  const parsed = parseQuantity(text, unit);
  if (!parsed.ok) return parsed;
  const value = parsed.value.value;
  const ranges = context.instrumentRanges.filter((range) => range.unit === unit);
  const judged = judge({
    reading: value,
    limits: limitsOf(limits, unit),
    accuracy: pickRange(ranges, value),
    rule: context.rule,
  });
  const reading = {
    label,
    typed: text,
    value,
    unit,
    lower: limits.lower,
    upper: limits.upper,
    expandedUncertainty: judged.expandedUncertainty ?? null,
    verdict: judged.verdict,
  };
  return { ok: true, reading, sentences: judged.sentences };
}

const ORDER: readonly Verdict[] = ["conforms", "guard-band", "does-not-conform"];

export function worstVerdict(readings: readonly JudgedReading[]): Verdict {
  return readings.reduce<Verdict>(
    (worst, { verdict }) => (ORDER.indexOf(verdict) > ORDER.indexOf(worst) ? verdict : worst),
    "conforms",
  );
}
