import { z } from "zod";

const figure = (what: string) => z.number({ message: `Give ${what} as a number.` });
const positive = (what: string) => figure(what).positive(`${what} must be more than 0.`);
const magnitude = (what: string) => figure(what).min(0, `${what} is a magnitude: 0 or more.`);

/** The figures of a family without its name, as they are stored; units as in lib/calc/levels. */
export const familyFigures = z.object({
  technology: z.enum(["CMOS", "bipolar"]),
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
  source: z.string().trim().max(200, "Keep the source under 200 characters."),
});
