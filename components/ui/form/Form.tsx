"use client";

import { zodResolver } from "@hookform/resolvers/zod";
import clsx from "clsx";
import type { ReactNode } from "react";
import { FormProvider, useForm, type DefaultValues, type FieldValues, type UseFormReturn } from "react-hook-form";
import type { z } from "zod";
import { Button } from "../Button";
import type { ButtonKind } from "../button-style";
import { Notice } from "../Notice";
import { useIsReady } from "../use-is-ready";
import type { Reply } from "./reply";
import { useFormSubmit } from "./useFormSubmit";

export type FormProps<Values extends FieldValues, Value> = {
  /** The schema that the action parses with, too. */
  schema: z.ZodType<unknown, Values>;
  /** A value for every field, also the empty ones. */
  defaults: DefaultValues<Values>;
  action: (values: Values) => Promise<Reply<Value>>;
  onDone?: (value: Value, values: Values) => void;
  /** Empties the form after success, for forms that are used again and again. */
  resetsWhenDone?: boolean;
  submitLabel: string;
  submitKind?: ButtonKind;
  /** Beside the submit button, e.g. a cancel button. */
  actions?: ReactNode;
  /** Names the form for assistive technology. */
  label?: string;
  className?: string;
  children: ReactNode | ((form: UseFormReturn<Values, unknown, Values>) => ReactNode);
};

/**
 * Checks while one leaves a field that was wrong, sends what was typed (the action parses it again), keeps it when the
 * answer is no, and puts the focus on the first field that needs another look.
 */
export function Form<Values extends FieldValues, Value>(props: FormProps<Values, Value>) {
  const form = useForm<Values, unknown, Values>({
    resolver: zodResolver(props.schema, undefined, { raw: true }),
    defaultValues: props.defaults,
    mode: "onSubmit",
    reValidateMode: "onChange",
    shouldFocusError: true,
  });
  const { submit, isPending } = useFormSubmit(form, props);
  const isReady = useIsReady();
  const failure = form.formState.errors.root?.message;
  const { children } = props;
  return (
    <FormProvider {...form}>
      <form
        noValidate
        method="post"
        aria-label={props.label}
        onSubmit={(event) => void submit(event)}
        className={clsx("flex flex-col gap-4.5", props.className)}
      >
        {typeof children === "function" ? children(form) : children}
        {failure && <Notice kind="error">{failure}</Notice>}
        <div className="flex flex-col-reverse gap-2 *:w-full sm:flex-row sm:justify-end sm:*:w-auto">
          {props.actions}
          <Button type={isReady ? "submit" : "button"} kind={props.submitKind ?? "primary"} isPending={isPending}>
            {props.submitLabel}
          </Button>
        </div>
      </form>
    </FormProvider>
  );
}
