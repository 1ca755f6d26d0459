import { defineBenchKind } from "../bench-kind";
import { isStatedEntry, NOTHING_STATED, state, summariseStated, type StatedEntry } from "../stated-verdict";
import { BenchForm } from "./BenchForm";
import { judge } from "./judge";
import type { Spec } from "./schema";

export const statementOnBench = defineBenchKind<Spec, StatedEntry>({
  measured: false,
  isEntry: isStatedEntry,
  emptyEntry: () => NOTHING_STATED,
  isBlank: (entry) => entry.conforms === null,
  stated: state,
  judge,
  summary: (_spec, entry) => summariseStated(entry),
  requires: () => undefined,
  units: () => [],
  expected: (spec) => spec.expects || undefined,
  BenchForm,
});
