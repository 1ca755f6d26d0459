import { z } from "zod";
import { figure, optionalFigure } from "@/lib/form/figure-field";
import { line } from "@/lib/form/text";
import { writeId } from "@/lib/form/write-id";

const toMm = (metres: number | null) => (metres === null ? null : Number((metres * 1e3).toPrecision(9)));
const toUm = (metres: number | null) => (metres === null ? null : Number((metres * 1e6).toPrecision(9)));

/** Fed by no board of the machine. */
export const INLET = "inlet";

/** A rail as typed. `rail` is its id, or "" for a new one. */
export const saveRailInput = z
  .object({
    project: z.string(),
    writeId,
    rail: z.union([z.uuid(), z.literal("")], { message: "Name the rail." }),
    version: z.int(),
    name: line(40, "Name the rail as the pin map does: +5V."),
    volts: figure("V", "Say what voltage it has.", { least: -400, most: 400, example: "5 V" }).refine(
      (volts) => volts !== 0,
      "A rail at 0 V is ground; it needs no line here.",
    ),
    tolerancePercent: figure("%", "Say how far it may be off.", { least: 0, most: 50, example: "5 %" }),
    capacityA: optionalFigure("A", { least: 1e-6, most: 1000, example: "3 A" }),
    /** Id of the board that feeds it into the backplane, or the backplane's own inlet. */
    source: z.union([z.uuid(), z.literal(INLET)], { message: "Choose what feeds it." }),
    segmentMm: optionalFigure("m", { least: 1e-4, most: 0.5, example: "20.32 mm" }).transform(toMm),
    widthMm: optionalFigure("m", { least: 5e-5, most: 0.5, example: "3 mm" }).transform(toMm),
    thicknessUm: optionalFigure("m", { least: 5e-6, most: 2e-3, example: "35 µm" }).transform(toUm),
  })
  .transform(({ segmentMm, widthMm, thicknessUm, source, ...rest }, context) => {
    const sourceBoardId = source === INLET ? null : source;
    if (segmentMm === null && widthMm === null && thicknessUm === null) return { ...rest, sourceBoardId, copper: null };
    if (segmentMm !== null && widthMm !== null && thicknessUm !== null) {
      return { ...rest, sourceBoardId, copper: { segmentMm, widthMm, thicknessUm } };
    }
    const sizes = { segmentMm, widthMm, thicknessUm };
    for (const [field, value] of Object.entries(sizes)) {
      const message = "The drop needs all three sizes of the copper, or none of them.";
      if (value === null) context.addIssue({ code: "custom", path: [field], message });
    }
    return z.NEVER;
  });
export type SaveRailInput = z.output<typeof saveRailInput>;
export type SaveRailTyped = z.input<typeof saveRailInput>;

export const removeRailInput = z.object({
  project: z.string(),
  writeId,
  rail: z.uuid({ message: "Name the rail." }),
  version: z.int(),
});
export type RemoveRailInput = z.output<typeof removeRailInput>;

/** A rail as it is kept; what a stale edit is shown. */
export const railNow = z.object({
  id: z.uuid(),
  name: z.string(),
  volts: z.number(),
  tolerancePercent: z.number(),
  capacityA: z.number().nullable(),
  sourceBoardId: z.uuid().nullable(),
  copper: z.object({ segmentMm: z.number(), widthMm: z.number(), thicknessUm: z.number() }).nullable(),
  version: z.int(),
});
export type RailNow = z.output<typeof railNow>;
