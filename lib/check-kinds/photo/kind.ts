import { defineKind } from "../define-kind";
import { statedEntryShape } from "../stated-entry-shape";
import { NOTHING_STATED, summariseStated } from "../stated-verdict";
import { judge, requires } from "./judge";
import { RecordView } from "./RecordView";
import { specFromTyped, specShape, typedShape } from "./schema";

export const photo = defineKind({
  name: "photo",
  label: "Photo",
  description: "The builder takes photos as evidence and says whether what they show conforms.",
  specShape,
  typedShape,
  specFromTyped,
  emptyTyped: { expects: "", minimum: "1" },
  typedFromSpec: (spec) => ({ expects: spec.expects, minimum: String(spec.minimum) }),
  entryShape: statedEntryShape,
  emptyEntry: () => NOTHING_STATED,
  judge,
  expectation: (spec) => spec.expects || (spec.minimum === 1 ? "photo" : `${spec.minimum} photos`),
  summary: (_spec, entry) => summariseStated(entry),
  measured: false,
  requires,
  RecordView,
});
