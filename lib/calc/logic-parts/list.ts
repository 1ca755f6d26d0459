import { GATE_FUNCTION_NAMES } from "./gate-functions";
import { BUFFER_PARTS } from "./list/buffers";
import { COUNTER_PARTS } from "./list/counters";
import { GATE_PARTS } from "./list/gates";
import { REGISTER_PARTS } from "./list/registers";
import { SELECTOR_PARTS } from "./list/selectors";
import { type LogicPart } from "./part";

/** Parts of the 74 series by function, simple gates first. */
export const LOGIC_PARTS: readonly LogicPart[] = [
  ...GATE_PARTS,
  ...REGISTER_PARTS,
  ...SELECTOR_PARTS,
  ...COUNTER_PARTS,
  ...BUFFER_PARTS,
];

/** The part with this number: "283". */
export const findPart = (number: string): LogicPart | undefined => LOGIC_PARTS.find((part) => part.number === number);

/** All parts whose gates do this; the first is the usual choice. The project's own parts go before the built-in ones. */
export const partsFor = (gateFunction: string, own: readonly LogicPart[] = []): LogicPart[] =>
  [...own, ...LOGIC_PARTS].filter((part) => part.gateFunction === gateFunction);

export const partFor = (gateFunction: string, own: readonly LogicPart[] = []): LogicPart | undefined =>
  partsFor(gateFunction, own)[0];

/** "2-input NAND" for nand2: what people read beside a count of gates. */
export function gateFunctionName(gateFunction: string): string {
  const name = Object.hasOwn(GATE_FUNCTION_NAMES, gateFunction) ? GATE_FUNCTION_NAMES[gateFunction] : undefined;
  return name ?? gateFunction;
}
