import { z } from "zod";
import { refuse, ok, type Answer } from "@/lib/actions/answer";
import type { Fault } from "@/lib/calc/computed";
import { inputErrors, sayIssue } from "./input-errors";

export type Outcome = { ok: true; result: object } | { ok: false; fields: Record<string, string> };

type Definition<Schema extends z.ZodType> = {
  /** As in the address: "pull-up". */
  name: string;
  /** What it works out, in one sentence. */
  about: string;
  /** Formulas, standards and where their figures come from. */
  source: string;
  /** What it does not know. */
  leavesOut: string;
  /** How much it takes at once. */
  most: string;
  input: Schema;
  example: z.input<Schema>;
  run: (input: z.output<Schema>) => Outcome;
};

export type Calculated = { calculation: string; result: object; source: string; leavesOut: string };

export type Calculation = {
  name: string;
  /** What the address answers to whoever only looks: what it takes, and an example that works. */
  card: () => object;
  example: unknown;
  calculate: (raw: unknown) => Answer<Calculated>;
};

const AID = "A planning aid, no proof of safety: local electrical codes and a licensed person have the last word.";

/** Closes over the types of one calculation, so that the list needs no cast. */
export function defineCalculation<Schema extends z.ZodType>(definition: Definition<Schema>): Calculation {
  const { name, about, source, leavesOut, most, example } = definition;
  return {
    name,
    example,
    card: () => ({
      ...{ calculation: name, about, source, leavesOut, most, note: AID },
      input: z.toJSONSchema(definition.input, { io: "input" }),
      example,
    }),
    calculate: (raw) => {
      const parsed = definition.input.safeParse(raw, { error: sayIssue });
      if (!parsed.success) return notUsable(inputErrors(parsed.error));
      const outcome = definition.run(parsed.data);
      if (!outcome.ok) return notUsable(outcome.fields);
      return ok({ calculation: name, result: outcome.result, source, leavesOut });
    },
  };
}

const notUsable = (fields: Record<string, string>): Answer<never> =>
  refuse("invalid", "Something in the input cannot be used; nothing was worked out.", { fields });

/** A field that a calculation could not use, at its place in the input. */
export const faulty = ({ field, message }: Fault, at = ""): Outcome => ({
  ok: false,
  fields: { [[at, field.replaceAll("/", ".")].filter(Boolean).join(".")]: message },
});
