import { z } from "zod";
import { isUnit, parseQuantity, UNITS, type Unit } from "@/lib/calc/units";

const figure = z.string().max(40, "This is too long for a figure.");

/** One range as the data sheet states it and people type it: "20 V", "1 mV", "0.05 %", "2". */
const typedRange = z.object({
  unit: z.string(),
  fullScale: figure,
  resolution: figure,
  percentOfReading: figure,
  counts: figure,
  percentOfRange: figure,
});
export type TypedRange = z.input<typeof typedRange>;
type FigureName = Exclude<keyof TypedRange, "unit">;

export const EMPTY_RANGE: TypedRange = {
  unit: "V",
  fullScale: "",
  resolution: "",
  percentOfReading: "",
  counts: "0",
  percentOfRange: "0",
};

/** What a meter, scope or supply reads; lengths, masses and ratios are no ranges of theirs. */
const NOT_MEASURED: readonly Unit[] = ["", "%", "dB", "m", "g"];
export const RANGE_UNITS = UNITS.filter(({ unit }) => !NOT_MEASURED.includes(unit));

type Asked = { isOwnUnit: boolean; holds: (value: number) => boolean; otherwise: string };
const positive = (value: number) => Number.isFinite(value) && value > 0;
const percentage = {
  isOwnUnit: false,
  holds: (value: number) => value >= 0 && value <= 100,
  otherwise: "A percentage from 0 to 100.",
};

const FIGURES: Record<FigureName, Asked> = {
  fullScale: { isOwnUnit: true, holds: positive, otherwise: "The full scale should be above zero." },
  resolution: { isOwnUnit: true, holds: positive, otherwise: "The resolution should be above zero." },
  percentOfReading: percentage,
  counts: {
    isOwnUnit: false,
    holds: (value) => value >= 0 && value <= 100_000,
    otherwise: "A number of counts from 0 to 100,000.",
  },
  percentOfRange: percentage,
};

/** The figures of a range in base units, or one sentence for each field that does not read. */
export const rangeSchema = typedRange.transform((typed, context) => {
  const say = (name: keyof TypedRange, message: string) => {
    context.addIssue({ code: "custom", path: [name], message });
    return Number.NaN;
  };
  const { unit } = typed;
  if (!isUnit(unit)) {
    say("unit", "Choose what the range measures.");
    return z.NEVER;
  }
  const read = (name: FigureName) => {
    const { isOwnUnit, holds, otherwise } = FIGURES[name];
    const text = typed[name].trim();
    if (text === "") return say(name, "Copy the figure from the data sheet.");
    const parsed = parseQuantity(isOwnUnit ? text : text.replace(/\s*%$/, ""), isOwnUnit ? unit : "");
    if (!parsed.ok) return say(name, parsed.message);
    return holds(parsed.value.value) ? parsed.value.value : say(name, otherwise);
  };
  const range = {
    unit,
    fullScale: read("fullScale"),
    resolution: read("resolution"),
    percentOfReading: read("percentOfReading"),
    counts: read("counts"),
    percentOfRange: read("percentOfRange"),
  };
  if (range.resolution > range.fullScale) say("resolution", "The resolution should be finer than the full scale.");
  if (range.percentOfReading + range.counts + range.percentOfRange === 0) {
    say("percentOfReading", "No instrument is exact: one of the three should be above zero.");
  }
  return range;
});
