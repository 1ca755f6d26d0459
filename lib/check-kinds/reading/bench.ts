import { defineBenchKind } from "../bench-kind";
import { figure } from "../reading-limits";
import { BenchForm } from "./BenchForm";
import { isEntry } from "./entry";
import { judge } from "./judge";
import type { Entry, Spec } from "./schema";
import { summary } from "./summary";

export const readingOnBench = defineBenchKind<Spec, Entry>({
  measured: true,
  isEntry,
  emptyEntry: () => ({ typed: "" }),
  isBlank: (entry) => entry.typed.trim() === "",
  judge,
  summary,
  requires: () => undefined,
  units: (spec) => [spec.unit],
  expected: (spec) => (spec.expected ? figure(spec.expected.value, spec.unit) : undefined),
  BenchForm,
});
