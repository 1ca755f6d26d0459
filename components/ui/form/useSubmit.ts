"use client";

import { useState } from "react";
import { reach, type Refused, type Reply } from "./reply";

/** For acts without a form: a button, a menu entry, a switch. `submit` resolves to the reply. */
export function useSubmit<Input, Value>(
  action: (input: Input) => Promise<Reply<Value>>,
  { onDone }: { onDone?: (value: Value, input: Input) => void } = {},
) {
  const [isPending, setPending] = useState(false);
  const [error, setError] = useState<Refused>();

  async function submit(input: Input): Promise<Reply<Value>> {
    setPending(true);
    setError(undefined);
    const reply = await reach(() => action(input)).finally(() => setPending(false));
    if (reply.ok) onDone?.(reply.value, input);
    else setError(reply.error);
    return reply;
  }

  return { submit, isPending, error, clear: () => setError(undefined) };
}
