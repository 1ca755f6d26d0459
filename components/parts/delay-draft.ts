import { findPart, LOGIC_PARTS, partLabel, type LogicPart } from "@/lib/calc/logic-parts";
import type { TypedPath } from "@/lib/delay-path/schema";

export const EMPTY_PATH: TypedPath = {
  measure: "",
  steps: [],
  unknownMinShare: "25 %",
  unknownMaxShare: "200 %",
  derating: null,
  clock: null,
};

export const EMPTY_STEP = { part: "", family: "HC", name: "", count: "1", minS: "", typicalS: "", maxS: "" };

/** Parts to choose for a step; what is not in the list is named by hand. */
export const partChoices = (own: readonly LogicPart[]) =>
  [...own, ...LOGIC_PARTS].map((part) => ({ id: part.number, label: partLabel(part, "…"), description: part.name }));

export const partOf = (own: readonly LogicPart[], number: string): LogicPart | undefined =>
  own.find((part) => part.number === number) ?? findPart(number);
