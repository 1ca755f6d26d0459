import { refuse, type Answer } from "@/lib/actions/answer";
import type { Call } from "@/lib/http/call";
import { limit } from "@/lib/http/rate-limit";
import type { Calculated } from "./define-calculation";
import { CALCULATIONS, findCalculation } from "./list";

type Asked = { calculation: string } & Record<string, unknown>;

/** Works out what was asked for and keeps nothing of it. */
export async function calculate(
  { calculation: name, ...input }: Asked,
  call: Call,
  request: Request,
): Promise<Answer<Calculated>> {
  const calculation = findCalculation(name);
  if (!calculation) return unknownCalculation(name);
  if (!request.headers.get("content-type")?.includes("json")) {
    return refuse("wrong-type", "Send the input as JSON, with the content type application/json.");
  }
  const allowed = await limit("calculations", call.ip);
  return allowed.ok ? calculation.calculate(input) : allowed;
}

/** What a calculation takes, with an example that works. */
export function describeCalculation(name: string): Answer<object> {
  const calculation = findCalculation(name);
  return calculation ? { ok: true, value: calculation.card() } : unknownCalculation(name);
}

function unknownCalculation(name: string): Answer<never> {
  const known = CALCULATIONS.map((calculation) => calculation.name);
  return refuse("not-found", `There is no calculation “${name.slice(0, 60)}”. There are ${known.join(", ")}.`, {
    details: { calculations: known },
  });
}
