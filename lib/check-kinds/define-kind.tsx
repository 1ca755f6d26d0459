import type { z } from "zod";
import { fieldErrors } from "@/lib/actions/field-errors";
import type { CheckKind, CheckKindDefinition, Read, RecordViewProps } from "./kind";

function read<Value>(schema: z.ZodType<Value>, raw: unknown, message: string): Read<Value> {
  const parsed = schema.safeParse(raw);
  return parsed.success ? { ok: true, value: parsed.data } : { ok: false, message, fields: fieldErrors(parsed.error) };
}

/**
 * Closes over the types of one kind, so that the list of kinds needs no cast: whatever comes in is read through the
 * kind's own schemas before its own code sees it.
 */
export function defineKind<const Name extends string, Spec, Typed, Entry>(
  kind: CheckKindDefinition<Name, Spec, Typed, Entry>,
): CheckKind<Name> {
  const { RecordView, specShape, entryShape } = kind;

  function ErasedRecordView({ spec, record, readings, rule }: RecordViewProps<unknown, unknown>) {
    return (
      <RecordView
        spec={specShape.parse(spec)}
        record={entryShape.safeParse(record).data}
        readings={readings}
        rule={rule}
      />
    );
  }

  return {
    name: kind.name,
    label: kind.label,
    description: kind.description,
    measured: kind.measured,
    emptyTyped: kind.emptyTyped,
    typedFromSpec: (spec) => kind.typedFromSpec(specShape.parse(spec)),
    readTyped: (typed) => read(kind.specFromTyped, typed, "Something in the check needs another look."),
    emptyEntry: (spec) => kind.emptyEntry(specShape.parse(spec)),
    readEntry: (entry) => read(entryShape, entry, NOT_AN_ENTRY),
    judge: (spec, entry, context) => {
      const entered = read(entryShape, entry, NOT_AN_ENTRY);
      return entered.ok ? kind.judge(specShape.parse(spec), entered.value, context) : entered;
    },
    expectation: (spec) => kind.expectation(specShape.parse(spec)),
    summary: (spec, entry, readings) => {
      const entered = entryShape.safeParse(entry);
      return entered.success ? kind.summary(specShape.parse(spec), entered.data, readings) : "";
    },
    requires: (spec) => kind.requires(specShape.parse(spec)),
    RecordView: ErasedRecordView,
  };
}

const NOT_AN_ENTRY = "What was entered does not fit this kind of check. Nothing was recorded.";
