import { z } from "zod";
import { isUnit, parseQuantity, UNITS, type Unit } from "@/lib/calc/units";
import { line, optionalLines } from "@/lib/form/text";
import { writeId } from "@/lib/form/write-id";

export const INSTRUMENT_KINDS = ["meter", "scope", "supply", "other"] as const;
export const MAX_RANGES = 40;

/** One range as the data sheet states it and people type it: "20 V", "1 mV", "0.05 %", "2". */
const typedRange = z.object({
  unit: z.string(),
  fullScale: z.string().max(40, "This is too long for a figure."),
  resolution: z.string().max(40, "This is too long for a figure."),
  percentOfReading: z.string().max(40, "This is too long for a figure."),
  counts: z.string().max(40, "This is too long for a figure."),
  percentOfRange: z.string().max(40, "This is too long for a figure."),
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

/** The figures of a range in base units, or one sentence for each field that does not read. */
const range = typedRange.transform((typed, context) => {
  const say = (name: keyof TypedRange, message: string) => {
    context.addIssue({ code: "custom", path: [name], message });
    return Number.NaN;
  };
  if (!isUnit(typed.unit)) {
    say("unit", "Choose what the range measures.");
    return z.NEVER;
  }
  const unit: Unit = typed.unit;
  const figure = (name: FigureName, expected: Unit) => {
    const parsed = parseQuantity(typed[name].replace(expected === "" ? /\s*%\s*$/ : /^$/, ""), expected);
    return parsed.ok ? parsed.value.value : say(name, parsed.message);
  };
  const fullScale = figure("fullScale", unit);
  const resolution = figure("resolution", unit);
  const percentOfReading = figure("percentOfReading", "");
  const counts = figure("counts", "");
  const percentOfRange = figure("percentOfRange", "");
  if (!Number.isFinite(fullScale) || fullScale <= 0) say("fullScale", "The full scale should be above zero.");
  if (!Number.isFinite(resolution) || resolution <= 0) say("resolution", "The resolution should be above zero.");
  if (resolution > fullScale) say("resolution", "The resolution should be finer than the full scale.");
  for (const [name, value] of Object.entries({ percentOfReading, percentOfRange })) {
    if (!(value >= 0 && value <= 100))
      say(name === "percentOfRange" ? name : "percentOfReading", "A percentage from 0 to 100.");
  }
  if (!(counts >= 0 && counts <= 100_000)) say("counts", "A number of counts from 0 to 100,000.");
  if (percentOfReading + counts + percentOfRange === 0)
    say("percentOfReading", "At least one part of the accuracy should be above zero.");
  return { unit, fullScale, resolution, percentOfReading, counts, percentOfRange };
});

const fields = {
  name: line(120, "Name the instrument as it stands on the bench."),
  kind: z.enum(INSTRUMENT_KINDS, { message: "Choose what it is." }),
  calibrationNote: optionalLines(2000),
  ranges: z.array(range).max(MAX_RANGES, `At most ${MAX_RANGES} ranges.`),
};

/** `instrument` is its id, or "" for a new one. */
export const saveInstrumentInput = z.object({ writeId, instrument: z.union([z.uuid(), z.literal("")]), ...fields });
export type SaveInstrumentInput = z.output<typeof saveInstrumentInput>;
export type SaveInstrumentTyped = z.input<typeof saveInstrumentInput>;

export const changeInstrumentInput = z.object({ writeId, instrument: z.uuid({ message: "Name the instrument." }) });
export type ChangeInstrumentInput = z.output<typeof changeInstrumentInput>;

/** What a meter, scope or supply reads; lengths, masses and ratios are no ranges of theirs. */
const NOT_MEASURED: readonly Unit[] = ["", "%", "dB", "m", "g"];
export const RANGE_UNITS = UNITS.filter(({ unit }) => !NOT_MEASURED.includes(unit));
