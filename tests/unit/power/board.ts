import { LOGIC_PARTS, type LogicPart } from "@/lib/calc/logic-parts";
import {
  boardPower,
  type BoardPower,
  type BoardPowerInput,
  type FixedItem,
  type RailDraw,
  type RegulatorItem,
} from "@/lib/calc/power";

export const FIVE_VOLTS = { name: "+5V", volts: 5, tolerancePercent: 5 };

export const board = (change: Partial<BoardPowerInput>): BoardPowerInput => ({
  items: [],
  rails: [FIVE_VOLTS],
  typed: [],
  elsewhere: [],
  ...change,
});

export function powerOf(change: Partial<BoardPowerInput>): BoardPower {
  const result = boardPower(board(change));
  if (!result.ok) throw new Error(`${result.field}: ${result.message}`);
  return result.value;
}

/** Empty where the board can be added up. */
export function faultOf(change: Partial<BoardPowerInput>): string {
  const result = boardPower(board(change));
  return result.ok ? "" : `${result.field}: ${result.message}`;
}

export function railOf({ rails }: BoardPower, name: string): RailDraw {
  const rail = rails.find((one) => one.rail === name);
  if (!rail) throw new Error(`nothing is taken from ${name}`);
  return rail;
}

export const fixed = (amps: number, change: Partial<FixedItem> = {}): FixedItem => ({
  kind: "fixed",
  label: "Display",
  rail: "+5V",
  count: 1,
  typicalA: amps / 2,
  worstA: amps,
  atRest: 1,
  ...change,
});

export const linear = (
  label: string,
  rail: string,
  output: string,
  outputVolts: number,
  groundA = 0.005,
): RegulatorItem => ({
  kind: "regulator",
  label,
  rail,
  output,
  outputVolts,
  type: { kind: "linear", groundA },
});

export function partNumbered(number: string): LogicPart {
  const part = LOGIC_PARTS.find((one) => one.number === number);
  if (!part) throw new Error(`there is no 74${number}`);
  return part;
}
