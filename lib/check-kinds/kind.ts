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
  /** The builder's note beside the record: what does not conform by eye must be described. */
  note: string;
};

/** One reading, judged. Values in base units; an overload is ±Infinity, which JSON turns into null. */
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
  /** By which the limits are drawn: with guard bands or without. */
  rule: DecisionRule;
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
export type RecordViewProps<Spec, Entry> = {
  spec: Spec;
  record: Entry | undefined;
  readings: JudgedReading[];
  rule: DecisionRule;
};

/** Evidence without which an attempt of a check cannot be recorded. */
export type Requires = { kinds: AttachmentKind[]; minimum: number };

/**
 * One kind of check: one folder, one entry in list.ts. Its two forms stand in lists of their own (bench-list.ts,
 * spec-forms.tsx), which do not compile without an entry for every kind: whatever a server page imports is sent to
 * that page's browser, so the forms must not hang on what loaders import.
 * Spec: what the procedure says. Typed: the same as the editor's form holds it. Entry: what the builder enters.
 * Spec and entry are stored as JSON and read again through the schemas. Schemas named …Shape only say what is there,
 * so that a half-filled form passes; what is wrong with it is said by specFromTyped and judge.
 */
export type CheckKindDefinition<Name extends string, Spec, Typed, Entry> = {
  name: Name;
  /** In the procedure editor: "Reading with limits". */
  label: string;
  /** One sentence for the editor on when to take it. */
  description: string;
  /** Reads the stored spec. */
  specShape: z.ZodType<Spec>;
  typedShape: z.ZodType<Typed>;
  /** Turns what was typed in the editor (limits with units …) into the spec that is stored, or says what is wrong where. */
  specFromTyped: z.ZodType<Spec, Typed>;
  emptyTyped: Typed;
  /** From the stored spec back to the form. */
  typedFromSpec: (spec: Spec) => Typed;
  entryShape: z.ZodType<Entry>;
  emptyEntry: (spec: Spec) => Entry;
  judge: (spec: Spec, entry: Entry, context: JudgeContext) => Judged;
  /** "4.75 … 5.25 V", "by eye", "photo": the expectation in a few characters, for rows and mails. */
  expectation: (spec: Spec) => string;
  /** "4.983 V", "conforms": the record in a few characters, for rows, events and mails. */
  summary: (spec: Spec, entry: Entry, readings: JudgedReading[]) => string;
  /** True when the verdict comes from readings; then the bench has Record instead of Conforms / Does not conform. */
  measured: boolean;
  requires: (spec: Spec) => Requires | undefined;
  RecordView: ComponentType<RecordViewProps<Spec, Entry>>;
};

export type Read<Value> = { ok: true; value: Value } | { ok: false; message: string; fields: Record<string, string> };

/**
 * A kind as the rest of the program sees it: specs and entries are unknown JSON that the kind reads through its own
 * schemas. A stored spec that does not fit throws; what a person typed or entered never does.
 */
export type CheckKind<Name extends string = string> = {
  name: Name;
  label: string;
  description: string;
  measured: boolean;
  emptyTyped: unknown;
  typedFromSpec: (spec: unknown) => unknown;
  /** Editor form → the spec to store. Field paths are those of the form. */
  readTyped: (typed: unknown) => Read<unknown>;
  emptyEntry: (spec: unknown) => unknown;
  readEntry: (entry: unknown) => Read<unknown>;
  judge: (spec: unknown, entry: unknown, context: JudgeContext) => Judged;
  expectation: (spec: unknown) => string;
  /** Empty when the record is of another shape. */
  summary: (spec: unknown, entry: unknown, readings: JudgedReading[]) => string;
  requires: (spec: unknown) => Requires | undefined;
  RecordView: ComponentType<RecordViewProps<unknown, unknown>>;
};
