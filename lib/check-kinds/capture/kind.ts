import { defineKind } from "../define-kind";
import { statedEntryShape } from "../stated-entry-shape";
import { NOTHING_STATED, summariseStated } from "../stated-verdict";
import { expectedText } from "./expected-text";
import { judge, requires } from "./judge";
import { RecordView } from "./RecordView";
import { specFromTyped, specShape, typedShape } from "./schema";

export const capture = defineKind({
  name: "capture",
  label: "Capture",
  description: "The builder adds a scope picture or scope data and says whether it conforms.",
  specShape,
  typedShape,
  specFromTyped,
  emptyTyped: { expects: "", windowOf: "", window: "" },
  typedFromSpec: ({ expects, window }) => ({
    expects,
    windowOf: window?.of ?? "",
    window: window?.limits.typed ?? "",
  }),
  entryShape: statedEntryShape,
  emptyEntry: () => NOTHING_STATED,
  judge,
  expectation: (spec) => expectedText(spec) || "capture",
  summary: (_spec, entry) => summariseStated(entry),
  measured: false,
  requires,
  RecordView,
});
