type Loggable = { type: string; message: string; stack?: string; code?: string; cause?: Loggable };

/** A failed query names its values, which may be addresses, hashes and what people wrote: they stay out of the log. */
const withoutValues = (text: string) => text.replace(/\nparams: [\s\S]*?(?=\n {4}at |$)/g, "\nparams: [cut]");

/** What the log keeps of an error: kind, text, place, and why; none of its other members. */
export function loggableError(error: unknown, depth = 0): Loggable {
  if (!(error instanceof Error)) return { type: typeof error, message: withoutValues(String(error)) };
  const { name, message, stack, cause } = error;
  const code = "code" in error && typeof error.code === "string" ? error.code : undefined;
  return {
    type: name,
    message: withoutValues(message),
    ...(stack ? { stack: withoutValues(stack) } : {}),
    ...(code ? { code } : {}),
    ...(cause !== undefined && depth < 4 ? { cause: loggableError(cause, depth + 1) } : {}),
  };
}
