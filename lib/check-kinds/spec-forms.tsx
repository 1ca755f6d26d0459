"use client";

import type { ComponentType } from "react";
import type { z } from "zod";
import { typedShape as captureShape } from "./capture/schema";
import { SpecForm as CaptureForm } from "./capture/SpecForm";
import type { SpecFormProps } from "./kind";
import { checkKind, type CheckKindName } from "./list";
import { typedShape as photoShape } from "./photo/schema";
import { SpecForm as PhotoForm } from "./photo/SpecForm";
import { typedShape as readingShape } from "./reading/schema";
import { SpecForm as ReadingForm } from "./reading/SpecForm";
import { typedShape as statementShape } from "./statement/schema";
import { SpecForm as StatementForm } from "./statement/SpecForm";
import { typedShape as tableShape } from "./table/schema";
import { SpecForm as TableForm } from "./table/SpecForm";

type Form = ComponentType<SpecFormProps<unknown>>;

/** Closes over a kind's own type: what does not fit it, because another kind was chosen, starts empty. */
function closed<Typed>(kind: CheckKindName, shape: z.ZodType<Typed>, Own: ComponentType<SpecFormProps<Typed>>): Form {
  return function KindForm({ value, onChange, errors }) {
    const typed = shape.safeParse(value).data ?? shape.parse(checkKind(kind).emptyTyped);
    return <Own value={typed} onChange={onChange} errors={errors} />;
  };
}

const FORMS: Record<CheckKindName, Form> = {
  statement: closed("statement", statementShape, StatementForm),
  reading: closed("reading", readingShape, ReadingForm),
  table: closed("table", tableShape, TableForm),
  photo: closed("photo", photoShape, PhotoForm),
  capture: closed("capture", captureShape, CaptureForm),
};

/** The part of the procedure editor that belongs to the kind. */
export function SpecForm({ kind, ...rest }: SpecFormProps<unknown> & { kind: CheckKindName }) {
  const Form = FORMS[kind];
  return <Form {...rest} />;
}
