import { formatLimits } from "@/lib/calc/units";
import { defineKind } from "../define-kind";
import { judge } from "./judge";
import { RecordView } from "./RecordView";
import { entryShape, specFromTyped, specShape, typedShape } from "./schema";
import { summary } from "./summary";

export const reading = defineKind({
  name: "reading",
  label: "Reading with limits",
  description: "The builder measures one value; the limits, the instrument and the project's rule give the verdict.",
  specShape,
  typedShape,
  specFromTyped,
  emptyTyped: { unit: "V", limits: "", expected: "" },
  typedFromSpec: (spec) => ({ unit: spec.unit, limits: spec.limits.typed, expected: spec.expected?.typed ?? "" }),
  entryShape,
  emptyEntry: () => ({ typed: "" }),
  judge,
  expectation: (spec) => formatLimits(spec.limits.value),
  summary,
  measured: true,
  requires: () => undefined,
  RecordView,
});
