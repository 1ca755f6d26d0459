import { z } from "zod";
import { CHECK_STAGES, type StandingCheck } from "@/lib/calc/check-graph";
import { NO_PACES } from "@/lib/calc/forecast";
import { orderChecks, scheduleChecks } from "@/lib/calc/sequence";
import { defineCalculation, type Outcome } from "./define-calculation";
import { from, name } from "./fields";

const MOST_CHECKS = 1000;
const MOST_NEEDS = 100;

const check = z.strictObject({
  id: name,
  unit: name.describe("Serial of the unit that it stands on."),
  stage: z.enum(CHECK_STAGES),
  title: z.string().trim().max(200).default("").describe("Left away, its id stands for it."),
  holdPoint: z.boolean().default(false).describe("Until it holds, nothing after it on its unit may be done."),
  lifted: z.boolean().default(false).describe("The hold was lifted for this unit."),
  needs: z.array(name).max(MOST_NEEDS).default([]).describe("Ids of checks that must hold first, on any unit."),
  state: z.enum(["untested", "passed", "failed", "reopened", "doubtful", "conceded"]).default("untested"),
});

const pace = from(1, 86_400).nullable().default(null);

const input = z.strictObject({
  checks: z.array(check).min(1).max(MOST_CHECKS).describe("In the order of each unit's traveler."),
  paces: z
    .strictObject({
      inspection: pace,
      continuity: pace,
      "power-on": pace,
      function: pace,
      integration: pace,
    })
    .default(NO_PACES)
    .describe("Seconds that a check takes, by stage; null: not known."),
  evening: z
    .strictObject({
      builders: z.union([z.literal(1), z.literal(2)]).default(1),
      seconds: from(60, 57_600).describe("Time there is."),
    })
    .nullable()
    .default(null)
    .describe("Null: no plan is asked for."),
});

type Given = z.output<typeof input>["checks"];

export const sequence = defineCalculation({
  name: "sequence",
  about: "Which checks can be done now, what each lets go, the longest chain, and a plan for one or two builders.",
  source:
    "Critical path: Kelley and Walker, 1959. List scheduling: Graham, Bounds on multiprocessing timing anomalies, SIAM J. Appl. Math. 17, 1969. The papers were not opened. Where no pace is known, five minutes a check: common practice, no source.",
  leavesOut: "Checks that fail, set-up between boards, and that a greedy plan need not be the best of all.",
  most: `${MOST_CHECKS} checks, ${MOST_NEEDS} prerequisites each.`,
  input,
  example: {
    checks: [
      { id: "sup-5v", unit: "SUP-01", stage: "power-on", title: "5 V rail", holdPoint: true, state: "passed" },
      { id: "tim-look", unit: "TIM-01", stage: "inspection", title: "Joints", holdPoint: true },
      { id: "tim-clk", unit: "TIM-01", stage: "function", title: "Clock", needs: ["sup-5v"] },
      { id: "sum-look", unit: "SUM-01", stage: "inspection", title: "Joints", holdPoint: true },
      { id: "sum-add", unit: "SUM-01", stage: "function", title: "Adds", needs: ["tim-clk"] },
    ],
    paces: { inspection: 240, function: 600 },
    evening: { builders: 2, seconds: 2700 },
  },
  run: ({ checks: given, paces, evening }): Outcome => {
    const fields = strayNames(given);
    if (Object.keys(fields).length > 0) return { ok: false, fields };
    const checks = given.map((one, position): StandingCheck => {
      const { unit, title, ...rest } = one;
      return { ...rest, unitId: unit, serial: unit, title: title === "" ? one.id : title, position };
    });
    const order = orderChecks(checks, paces);
    if (!order.ok) return { ok: false, fields: { checks: order.message } };
    const plan = evening && scheduleChecks(checks, evening, paces);
    return { ok: true, result: { ...order.value, plan: plan?.ok ? plan.value : null } };
  },
});

/** Ids that are there twice, and prerequisites that are not there, each by its path. */
function strayNames(checks: Given): Record<string, string> {
  const fields: Record<string, string> = {};
  const known = new Set<string>();
  checks.forEach(({ id }, index) => {
    if (known.has(id)) fields[`checks.${index}.id`] = `${id} is there twice.`;
    known.add(id);
  });
  checks.forEach(({ needs }, index) => {
    needs.forEach((id, at) => {
      if (!known.has(id)) fields[`checks.${index}.needs.${at}`] = `There is no check ${id}.`;
    });
  });
  return fields;
}
