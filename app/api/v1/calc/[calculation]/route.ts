import { z } from "zod";
import { defineRoute } from "@/lib/actions/define-route";
import { calculate, describeCalculation } from "@/lib/calc-api/calculate";

const asked = z.looseObject({ calculation: z.string() });

/** Room for a machine of 200 connectors with 200 pins each. */
const BODY_LIMIT = 8_000_000;

export const GET = defineRoute({
  name: "describe-calculation",
  permission: "public",
  input: asked,
  run: async (_scope, { calculation }) => describeCalculation(calculation),
});

export const POST = defineRoute({
  name: "calculate",
  permission: "public",
  browserOnly: false,
  bodyLimit: BODY_LIMIT,
  input: asked,
  run: async (_scope, input, call, request) => calculate(input, call, request),
});
