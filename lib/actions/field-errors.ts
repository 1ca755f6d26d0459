import type { z } from "zod";

/** One sentence by field path, for forms and for the `errors` member of a problem document. */
export function fieldErrors(error: z.ZodError): Record<string, string> {
  const fields: Record<string, string> = {};
  for (const issue of error.issues) {
    const path = issue.path.join(".") || "form";
    fields[path] ??= issue.message;
  }
  return fields;
}
