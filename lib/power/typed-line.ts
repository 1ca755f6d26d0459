import { z } from "zod";
import { figure } from "@/lib/form/figure-field";
import { line, optionalLine } from "@/lib/form/text";
import { wholeCount } from "@/lib/form/whole-count";
import type { PowerLineItem } from "./line-item";

const amps = (missing: string) => figure("A", missing, { most: 100, example: "120 mA" });
const ohms = figure("Ω", "Say which resistor.", { least: 0.01, most: 1e9, example: "4k7" });
const volts = (missing: string) => figure("V", missing, { most: 400, example: "2.1 V" });
const share = (missing: string) =>
  figure("%", missing, { most: 100, example: "50 %" }).transform((percent) => percent / 100);

const named = {
  label: line(60, "Name it as the parts list does."),
  rail: line(40, "Choose the rail it takes from."),
};
const counted = { ...named, count: wholeCount("Count", { most: 10_000 }) };
const measured = { typicalA: amps("Say what it draws as a rule."), worstA: amps("Say what it draws at most.") };

/** A line as its form holds it: figures as people write them. */
const typedLine = z.discriminatedUnion("kind", [
  z.object({
    kind: z.literal("led"),
    ...counted,
    forwardVolts: volts("Say what the LED drops."),
    ohm: ohms,
    litTypical: share("Say which share is lit as a rule."),
    litWorst: share("Say which share is lit at most."),
  }),
  z.object({
    kind: z.literal("pull-up"),
    ...counted,
    ohm: ohms,
    lowVolts: volts("Say how low the line is pulled."),
    lowTypical: share("Say how long it is low as a rule."),
    lowWorst: share("Say how long it is low at most."),
  }),
  z.object({
    kind: z.literal("regulator"),
    ...named,
    output: line(40, "Name the rail that it makes."),
    /** A magnitude: the sign is the rail's. */
    outputVolts: figure("V", "Say what it makes.", { least: -400, most: 400, example: "3.3 V" })
      .transform(Math.abs)
      .refine((value) => value > 0, "It makes more than 0 V."),
    type: z.enum(["linear", "switching"], { message: "Choose how it works." }),
    groundA: amps("Say what it takes for itself."),
    efficiency: share("Say how much of the power gets through."),
  }),
  z.object({
    kind: z.literal("fixed"),
    ...counted,
    ...measured,
    atRest: share("Say which share flows without a clock."),
  }),
  z.object({ kind: z.literal("whole"), label: optionalLine(60), rail: named.rail, ...measured }),
]);
export type TypedLine = z.input<typeof typedLine>;
type Read = z.output<typeof typedLine>;

/** From the form to what is kept. The worst is never below the typical. */
function readLine(typed: Read, context: z.RefinementCtx): PowerLineItem {
  const atLeast = (field: string, typical: number, worst: number) => {
    if (worst >= typical) return;
    context.addIssue({ code: "custom", path: [field], message: "At worst it is at least what it is as a rule." });
  };
  if (typed.kind === "led") {
    const { litTypical: typical, litWorst: worst, ...item } = typed;
    atLeast("litWorst", typical, worst);
    return { ...item, lit: { typical, worst } };
  }
  if (typed.kind === "pull-up") {
    const { lowTypical: typical, lowWorst: worst, ...item } = typed;
    atLeast("lowWorst", typical, worst);
    return { ...item, lowShare: { typical, worst } };
  }
  if (typed.kind === "regulator") {
    const { type, groundA, efficiency, ...item } = typed;
    if (item.output === item.rail) {
      context.addIssue({ code: "custom", path: ["output"], message: "It cannot make the rail that it takes from." });
    }
    if (type === "linear") return { ...item, type: { kind: "linear", groundA } };
    if (efficiency === 0) {
      context.addIssue({ code: "custom", path: ["efficiency"], message: "Nothing would get through at 0 %." });
    }
    return { ...item, type: { kind: "switching", efficiency } };
  }
  atLeast("worstA", typed.typicalA, typed.worstA);
  return typed;
}

/** The whole form: fields first, then what they say together. */
export const typedLineForm = typedLine.transform(readLine);
