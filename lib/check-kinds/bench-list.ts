import type { BenchKind } from "./bench-kind";
import { captureOnBench } from "./capture/bench";
import { photoOnBench } from "./photo/bench";
import { readingOnBench } from "./reading/bench";
import { statementOnBench } from "./statement/bench";
import { tableOnBench } from "./table/bench";
import type { CheckKindName } from "./list";

/** The light halves of the kinds of list.ts. A kind that is missing here does not compile. */
const BENCH_KINDS: Record<CheckKindName, BenchKind> = {
  statement: statementOnBench,
  reading: readingOnBench,
  table: tableOnBench,
  photo: photoOnBench,
  capture: captureOnBench,
};

/** The kind of that name, or undefined when the page is older than the server and does not know it yet. */
export function benchKind(name: string): BenchKind | undefined {
  return Object.entries(BENCH_KINDS).find(([known]) => known === name)?.[1];
}
