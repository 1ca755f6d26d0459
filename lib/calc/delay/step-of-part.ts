import { partLabel, type LogicPart } from "../logic-parts";
import { type DelayStep } from "./path";

/** A part of the list as a step; figures that the family has not stay null. Lowest delays are in no generic table. */
export function stepOfPart(part: LogicPart, family: string, count: number): DelayStep {
  const figures = Object.hasOwn(part.perFamily, family) ? part.perFamily[family] : undefined;
  return {
    name: partLabel(part, family),
    count,
    minS: null,
    typicalS: figures?.tpdTypicalS ?? null,
    maxS: figures?.tpdMaxS ?? null,
  };
}
