import { z } from "zod";
import { parseQuantity } from "@/lib/calc/units";
import { line } from "@/lib/form/text";
import { writeId } from "@/lib/form/write-id";
import { FIGURE_NAMES, figureOf, writeFigure, type FigureName } from "./figure-list";

const figure = (what: string) => z.number({ message: `Give ${what} as a number.` });
const positive = (what: string) => figure(what).positive(`${what} must be more than 0.`);
const magnitude = (what: string) => figure(what).min(0, `${what} is a magnitude: 0 or more.`);

/** The figures of a family without its name, as they are stored; units as in lib/calc/levels. */
export const familyFigures = z.object({
  technology: z.enum(["CMOS", "bipolar"], { message: "Choose what its inputs and outputs are made of." }),
  volts: positive("The supply"),
  vihMin: positive("VIH"),
  vilMax: positive("VIL"),
  vohMin: positive("VOH"),
  iohA: magnitude("IOH"),
  volMax: magnitude("VOL"),
  iolA: magnitude("IOL"),
  iihA: magnitude("IIH"),
  iilA: magnitude("IIL"),
  iozA: magnitude("IOZ"),
  inputPf: magnitude("The input capacitance"),
  outputPf: magnitude("The output capacitance"),
  tpdTypicalS: positive("The delay").nullable(),
  edgeS: positive("The edge"),
  inputMaxVolts: positive("The highest input voltage").nullable(),
  supply: z.object({ minVolts: positive("The lowest supply"), maxVolts: positive("The highest supply") }).optional(),
  source: z.string().trim().max(200, "Keep the source under 200 characters."),
});
export type FamilyFigures = z.output<typeof familyFigures>;

const typedFigure = z.string({ message: "Copy the figure from the data sheet." }).max(40, "This is too long.");

// One text a figure; Object.fromEntries() forgets the keys that it is given.
const typedFigures = z.object(
  Object.fromEntries(FIGURE_NAMES.map((name) => [name, typedFigure])) as Record<FigureName, typeof typedFigure>,
);
type TypedFigures = z.output<typeof typedFigures>;

const head = z.object({
  project: z.string(),
  writeId,
  /** "" for a new one. */
  familyId: z.union([z.uuid(), z.literal("")], { message: "Name the family." }),
  version: z.int(),
  name: line(40, "Name the family as pins will name it: HC, maker B."),
  technology: familyFigures.shape.technology,
  source: line(200, "Say where the figures come from: maker, sheet, page."),
});

export const saveFamilyInput = head
  .extend({ typed: typedFigures })
  .transform(({ typed, technology, source, ...rest }, context) => {
    const read = (name: FigureName) => readFigure(name, typed, (message) => complain(context, name, message));
    const values = Object.fromEntries(FIGURE_NAMES.map((name) => [name, read(name)]));
    const { minVolts, maxVolts, ...figures } = values;
    const supply = minVolts && maxVolts ? { supply: { minVolts, maxVolts } } : {};
    const before = context.issues.length;
    if ((minVolts === null) !== (maxVolts === null)) {
      complain(
        context,
        minVolts === null ? "minVolts" : "maxVolts",
        "Give both ends of the supply's range, or neither.",
      );
    }
    const checked = familyFigures.safeParse({ ...figures, ...supply, technology, source });
    if (before === 0 && checked.success) compareFigures(checked.data, (name, text) => complain(context, name, text));
    for (const issue of before > 0 ? [] : (checked.error?.issues ?? [])) {
      context.addIssue({ code: "custom", path: ["typed", String(issue.path.at(-1) ?? "")], message: issue.message });
    }
    return checked.success ? { ...rest, figures: checked.data } : z.NEVER;
  });
export type SaveFamilyInput = z.output<typeof saveFamilyInput>;

type Context = { addIssue: (issue: { code: "custom"; path: string[]; message: string; input?: unknown }) => void };

const complain = (context: Context, name: FigureName, message: string) =>
  context.addIssue({ code: "custom", path: ["typed", name], message });

function readFigure(name: FigureName, typed: TypedFigures, say: (message: string) => void): number | null {
  const { unit, scale, most, optional, magnitude: isMagnitude, example } = figureOf(name);
  const text = typed[name].trim();
  if (text === "") {
    if (!optional) say("Copy the figure from the data sheet.");
    return null;
  }
  const parsed = parseQuantity(text, unit);
  if (!parsed.ok) {
    say(parsed.message);
    return null;
  }
  const value = isMagnitude ? Math.abs(parsed.value.value) : parsed.value.value;
  if (value > most) {
    say(`${writeFigure(name, value / scale)} is too much for logic. Write it with its unit, as in ${example}.`);
    return null;
  }
  return Number((value / scale).toPrecision(12));
}

/** What no part can be: its own levels overlap, or its supply lies outside its range. */
function compareFigures(figures: FamilyFigures, say: (name: FigureName, message: string) => void) {
  const { volts, vihMin, vilMax, vohMin, volMax, supply } = figures;
  if (vilMax >= vihMin) say("vilMax", "VIL lies below VIH on every sheet.");
  if (volMax >= vohMin) say("volMax", "VOL lies below VOH on every sheet.");
  if (vohMin > volts) say("vohMin", "No output gives more than its supply.");
  if (supply && supply.minVolts > supply.maxVolts) say("maxVolts", "The range ends below where it begins.");
  else if (supply && (volts < supply.minVolts || volts > supply.maxVolts)) {
    say("volts", "The figures are for a supply outside the range given below.");
  }
}

export const removeFamilyInput = z.object({
  project: z.string(),
  writeId,
  familyId: z.uuid({ message: "Name the family." }),
  version: z.int(),
});
export type RemoveFamilyInput = z.output<typeof removeFamilyInput>;
