import { defineBenchKind } from "../bench-kind";
import { isStatedEntry, NOTHING_STATED, state, summariseStated, type StatedEntry } from "../stated-verdict";
import { BenchForm } from "./BenchForm";
import { expectedText } from "./expected-text";
import { judge, requires } from "./judge";
import type { Spec } from "./schema";

export const captureOnBench = defineBenchKind<Spec, StatedEntry>({
  measured: false,
  isEntry: isStatedEntry,
  emptyEntry: () => NOTHING_STATED,
  isBlank: (entry) => entry.conforms === null,
  stated: state,
  judge,
  summary: (_spec, entry) => summariseStated(entry),
  requires,
  units: () => [],
  expected: (spec) => expectedText(spec) || undefined,
  BenchForm,
});
