import { defineKind } from "../define-kind";
import { statedEntryShape } from "../stated-entry-shape";
import { NOTHING_STATED, summariseStated } from "../stated-verdict";
import { judge } from "./judge";
import { RecordView } from "./RecordView";
import { specFromTyped, specShape, typedShape } from "./schema";

export const statement = defineKind({
  name: "statement",
  label: "Statement",
  description: "The builder looks, listens or tries, and says whether it conforms.",
  specShape,
  typedShape,
  specFromTyped,
  emptyTyped: { expects: "" },
  typedFromSpec: (spec) => spec,
  entryShape: statedEntryShape,
  emptyEntry: () => NOTHING_STATED,
  judge,
  expectation: (spec) => spec.expects || "by eye",
  summary: (_spec, entry) => summariseStated(entry),
  measured: false,
  requires: () => undefined,
  RecordView,
});
