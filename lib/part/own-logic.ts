import { z } from "zod";
import { gateFunctionName, LOGIC_PARTS, type LogicPart } from "@/lib/calc/logic-parts";

const pinNumbers = z.array(z.int().min(1));
const figure = z.number().nonnegative().nullable();

/** Own logic data as it is stored. */
export const logicShape = z.object({
  number: z.string(),
  name: z.string(),
  gateFunction: z.string(),
  gatesPerPackage: z.int().min(1),
  bitsPerGate: z.int().min(1),
  inputsPerGate: z.int().min(0),
  outputsPerGate: z.int().min(0),
  output: z.enum(["push-pull", "three-state", "open-drain"]),
  pins: z.int().min(2),
  pinout: z.array(z.object({ inputs: pinNumbers, outputs: pinNumbers, restHigh: pinNumbers })).nullable(),
  sharedInputs: pinNumbers,
  sharedOutputs: pinNumbers,
  unconnectedPins: pinNumbers,
  powerPins: pinNumbers,
  groundPins: pinNumbers,
  inputPf: z.number().nonnegative(),
  perFamily: z.record(
    z.string(),
    z.object({
      staticA: figure,
      cpdPf: figure,
      cpdPer: z.enum(["gate", "package"]),
      tpdTypicalS: figure,
      tpdMaxS: figure,
      note: z.string(),
    }),
  ),
  source: z.string(),
}) satisfies z.ZodType<LogicPart>;

type PartRow = { number: string; logic: unknown; archivedAt: Date | null };

/** Logic data of the project's own parts in work. */
export const ownLogic = (rows: readonly PartRow[]): LogicPart[] =>
  rows.flatMap(({ logic, archivedAt }) => (logic === null || archivedAt ? [] : [logicShape.parse(logic)]));

/** What gates can do here: the built-in functions and those of the project's own parts. */
export const knownFunctions = (rows: readonly PartRow[]): Set<string> =>
  new Set([...LOGIC_PARTS, ...ownLogic(rows)].map((part) => part.gateFunction));

/** The same to choose from, each with its words and the part that does it. */
export function functionChoices(own: readonly LogicPart[]): { id: string; label: string; description: string }[] {
  const choices = new Map<string, { id: string; label: string; description: string }>();
  for (const part of [...own, ...LOGIC_PARTS]) {
    const { gateFunction, gatesPerPackage, number } = part;
    if (choices.has(gateFunction)) continue;
    const series = /^\d{1,4}$/.test(number) ? `74…${number}` : number;
    const description = `${gatesPerPackage} in a ${series}`;
    choices.set(gateFunction, { id: gateFunction, label: gateFunctionName(gateFunction), description });
  }
  return [...choices.values()];
}
