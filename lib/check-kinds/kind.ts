import type { ComponentType } from "react";
import type { z } from "zod";
import type { AttachmentKind } from "@/db/schema/evidence";
import type { InstrumentRange } from "@/db/schema/people";
import type { Verdict } from "@/db/schema/travelers";
import type { DecisionRule } from "@/db/schema/projects";

/** What the server knows when it judges; never taken from the client. */
export type JudgeContext = {
  rule: DecisionRule;
  /** Ranges of the instrument that was named; empty when none was. */
  instrumentRanges: InstrumentRange[];
  /** Kinds of the evidence that goes with the attempt. */
  evidence: AttachmentKind[];
};

/** One reading, judged. Values in base units. */
export type JudgedReading = {
  label: string;
  typed: string;
  value: number;
  unit: string;
  lower: number | null;
  upper: number | null;
  expandedUncertainty: number | null;
  verdict: Verdict;
};

export type Judged =
  | { ok: true; verdict: Verdict; readings: JudgedReading[]; sentences: string[] }
  /** Not a verdict: the record cannot be judged (a cell that is no number, a photo missing). */
  | { ok: false; message: string; fields?: Record<string, string> };

/** What the bench form is handed: its own value in, changes out. The frame owns keys, evidence, note and sending. */
export type BenchFormProps<Spec, Draft> = {
  spec: Spec;
  draft: Draft;
  onDraft: (draft: Draft) => void;
  /** Judged as one types, with the same code as on the server; undefined while there is nothing to judge. */
  judged: Judged | undefined;
  /** Enter in the last field, or a touch on one of the kind's own buttons. */
  onSubmit: (draft: Draft) => void;
  busy: boolean;
};

/** The part of the procedure editor that belongs to the kind. Values are what was typed; errors by field path. */
export type SpecFormProps<Typed> = {
  value: Typed;
  onChange: (value: Typed) => void;
  errors: Record<string, string>;
};

/** How a recorded attempt shows on the traveler, on the printed sheet (empty when nothing is recorded) and in a mail. */
export type RecordViewProps<Spec, Record> = { spec: Spec; record: Record | undefined; readings: JudgedReading[] };

/**
 * One kind of check, whole: one folder, one entry in list.ts.
 * Spec: what the procedure says. Record: what the builder enters. Both are stored as JSON and read through the schemas.
 */
export type CheckKindDefinition<Spec, Typed, Record> = {
  name: string;
  /** In the procedure editor: "Reading with limits". */
  label: string;
  /** One sentence for the editor on when to take it. */
  description: string;
  /** Parses what was typed in the editor (limits with units …) to the stored spec, and reads the stored spec again. */
  specSchema: z.ZodType<Spec, Typed>;
  emptySpec: Typed;
  /** From the stored spec back to the form. */
  typedSpec: (spec: Spec) => Typed;
  recordSchema: z.ZodType<Record>;
  emptyRecord: (spec: Spec) => Record;
  judge: (spec: Spec, record: Record, context: JudgeContext) => Judged;
  /** "4.75 … 5.25 V", "by eye", "photo": the expectation in a few characters, for rows and mails. */
  expectation: (spec: Spec) => string;
  /** "4.983 V", "conforms": the record in a few characters, for rows, events and mails. */
  summary: (spec: Spec, record: Record, readings: JudgedReading[]) => string;
  /** True when the verdict comes from readings; then the bench has Record instead of Conforms / Does not conform. */
  measured: boolean;
  /** Kinds of evidence without which it cannot be recorded. */
  requires: (spec: Spec) => { kinds: AttachmentKind[]; minimum: number } | undefined;
  BenchForm: ComponentType<BenchFormProps<Spec, Record>>;
  SpecForm: ComponentType<SpecFormProps<Typed>>;
  RecordView: ComponentType<RecordViewProps<Spec, Record>>;
};
