import { refuse, ok, type Answer } from "@/lib/actions/answer";
import { checkKind } from "@/lib/check-kinds/list";
import type { CheckFields } from "./schema";

/** Reads what belongs to the kind. The form and the server call the same, so both say the same under the same field. */
export function readSpec(check: Pick<CheckFields, "kind" | "typed">): Answer<unknown> {
  const spec = checkKind(check.kind).readTyped(check.typed);
  if (spec.ok) return ok(spec.value);
  const fields = Object.fromEntries(Object.entries(spec.fields).map(([path, text]) => [`check.typed.${path}`, text]));
  return refuse("invalid", "Something in the check needs another look.", { fields });
}
