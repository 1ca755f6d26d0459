"use client";

import { useState } from "react";
import type { FieldValues, Path, UseFormReturn } from "react-hook-form";
import { reach, type Refused, type Reply } from "./reply";

type Wiring<Values, Value> = {
  action: (values: Values) => Promise<Reply<Value>>;
  onDone?: (value: Value, values: Values) => void;
  resetsWhenDone?: boolean;
};

/** Sends a form's values and lays the refusal back on its fields; what belongs to no field becomes the root error. */
export function useFormSubmit<Values extends FieldValues, Value>(
  form: UseFormReturn<Values, unknown, Values>,
  { action, onDone, resetsWhenDone }: Wiring<Values, Value>,
) {
  const [isPending, setPending] = useState(false);

  const submit = form.handleSubmit(async (values) => {
    setPending(true);
    const reply = await reach(() => action(values)).finally(() => setPending(false));
    if (!reply.ok) return layRefusal(form, reply.error);
    if (resetsWhenDone) form.reset();
    onDone?.(reply.value, values);
  });

  return { submit, isPending };
}

function layRefusal<Values extends FieldValues>(form: UseFormReturn<Values, unknown, Values>, refused: Refused) {
  const known = Object.keys(form.control._fields);
  const strays: string[] = [];
  let hasFocused = false;
  for (const [name, message] of Object.entries(refused.fields ?? {})) {
    if (!isField<Values>(name, known)) {
      strays.push(message);
      continue;
    }
    form.setError(name, { type: "server", message }, { shouldFocus: !hasFocused });
    hasFocused = true;
  }
  form.setError("root", { type: refused.code, message: [refused.message, ...strays].join(" ") });
}

const isField = <Values extends FieldValues>(name: string, known: string[]): name is Path<Values> =>
  known.includes(name.split(".")[0] ?? name);
