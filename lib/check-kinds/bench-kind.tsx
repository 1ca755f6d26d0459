import type { ComponentType } from "react";
import type { BenchFormProps, Judged, JudgeContext, JudgedReading, Requires } from "./kind";

/**
 * The half of a kind that goes to the bench: judging as one types and the form, without schemas and editor, because
 * the bench has to be light on a phone. kind.ts of the same folder takes its judge and summary from here.
 */
export type BenchKindDefinition<Spec, Entry> = {
  measured: boolean;
  /** Whether a draft kept on the device is one of this kind; an older build may have kept another shape. */
  isEntry: (value: unknown) => value is Entry;
  emptyEntry: (spec: Spec) => Entry;
  /** Nothing was entered: there is nothing to judge, and nothing to lose. */
  isBlank: (entry: Entry) => boolean;
  /** The entry that a touch on Conforms or Does not conform makes; absent when the verdict comes from readings. */
  stated?: (conforms: boolean) => Entry;
  judge: (spec: Spec, entry: Entry, context: JudgeContext) => Judged;
  summary: (spec: Spec, entry: Entry, readings: JudgedReading[]) => string;
  requires: (spec: Spec) => Requires | undefined;
  /** Units of the readings, for the choice of the instrument. */
  units: (spec: Spec) => string[];
  /** What to expect, for the sheet: "Expected 5.00 V" stands beside the limits. */
  expected: (spec: Spec) => string | undefined;
  BenchForm: ComponentType<BenchFormProps<Spec, Entry>>;
};

/** The same with its types closed over, as the bench holds it. */
export type BenchKind = BenchKindDefinition<unknown, unknown>;

/**
 * Specs are not read through a schema again: the server has read each one through its kind's schema before it sent
 * it, and a schema library costs more than the whole bench. Entries are, since they may come from the device.
 */
export function defineBenchKind<Spec, Entry>(kind: BenchKindDefinition<Spec, Entry>): BenchKind {
  const spec = (value: unknown) => value as Spec;
  const entry = (given: unknown, value: unknown) => (kind.isEntry(value) ? value : kind.emptyEntry(spec(given)));
  const { BenchForm, stated } = kind;

  function ErasedBenchForm(props: BenchFormProps<unknown, unknown>) {
    return <BenchForm {...props} spec={spec(props.spec)} draft={entry(props.spec, props.draft)} />;
  }

  return {
    measured: kind.measured,
    isEntry: kind.isEntry,
    emptyEntry: (given) => kind.emptyEntry(spec(given)),
    isBlank: (value) => !kind.isEntry(value) || kind.isBlank(value),
    ...(stated ? { stated } : {}),
    judge: (given, value, context) => kind.judge(spec(given), entry(given, value), context),
    summary: (given, value, readings) => kind.summary(spec(given), entry(given, value), readings),
    requires: (given) => kind.requires(spec(given)),
    units: (given) => kind.units(spec(given)),
    expected: (given) => kind.expected(spec(given)),
    BenchForm: ErasedBenchForm,
  };
}
