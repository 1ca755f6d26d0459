import { judge } from "@/lib/calc/conformity";
import { formatQuantity, isUnit, type Unit } from "@/lib/calc/units";

export type StatedRange = {
  unit: string;
  fullScale: number;
  resolution: number;
  percentOfReading: number;
  counts: number;
  percentOfRange: number;
};

export type WorkedExample = {
  reading: string;
  limitOfError: string;
  uncertainty: string;
  limits: string;
  /** Absent when the uncertainty leaves nothing between the guard bands. */
  acceptance: string | undefined;
  /** The uncertainty is more than a quarter of the tolerance. */
  isCoarse: boolean;
};

/** What the range's accuracy means for one reading with limits of ± 5 %, as a judged check would say it. */
export function workedExample(range: StatedRange): WorkedExample | undefined {
  if (!isUnit(range.unit)) return undefined;
  const unit: Unit = range.unit;
  const value = exampleReading(range);
  const [lower, upper] = [value * 0.95, value * 1.05];
  const judged = judge({
    reading: { value, unit },
    limits: { unit, lower, upper },
    accuracy: { ...range, range: range.fullScale },
    rule: "guarded",
  });
  const write = (at: number) => formatQuantity({ value: at, unit }, { significant: 4 });
  return {
    reading: formatQuantity({ value, unit }, { resolution: range.resolution }),
    limitOfError: formatQuantity({ value: judged.maximumError ?? 0, unit }, { significant: 2 }),
    uncertainty: formatQuantity({ value: judged.expandedUncertainty ?? 0, unit }, { significant: 2 }),
    limits: `${write(lower)} … ${write(upper)}`,
    acceptance:
      judged.guardBand * 2 < upper - lower
        ? `${write(lower + judged.guardBand)} … ${write(upper - judged.guardBand)}`
        : undefined,
    isCoarse: judged.tooCoarse,
  };
}

/** 5 where the range holds it as the bench meets 5 V all day, otherwise half of the full scale. */
function exampleReading({ unit, fullScale }: StatedRange): number {
  return unit === "V" && fullScale >= 5 && fullScale <= 60 ? 5 : fullScale / 2;
}
