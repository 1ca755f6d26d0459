import { z } from "zod";
import type { Unit } from "@/lib/calc/units";
import { readFigure } from "./figure";

type Bounds = Parameters<typeof readFigure>[2];

/** A figure of a form as people write it, in the base unit; null when nothing is typed. */
export const optionalFigure = (unit: Unit, bounds: Bounds) =>
  z
    .string({ message: `Write it such as ${bounds.example}.` })
    .max(40, "This is too long for a figure.")
    .transform((typed, context) => {
      const read = readFigure(typed, unit, bounds);
      if (read.ok) return read.value;
      context.addIssue({ code: "custom", message: read.message });
      return z.NEVER;
    });

/** The same where it may not be left out; `missing` is the sentence when it is. */
export const figure = (unit: Unit, missing: string, bounds: Bounds) =>
  optionalFigure(unit, bounds).transform((value, context) => {
    if (value !== null) return value;
    context.addIssue({ code: "custom", message: missing });
    return z.NEVER;
  });
