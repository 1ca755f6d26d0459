import type { Judged, JudgeContext, Requires } from "../kind";
import { judgeStated, type StatedEntry } from "../stated-verdict";
import type { Spec } from "./schema";

export function requires(): Requires {
  return { kinds: ["scope-picture", "scope-data"], minimum: 1 };
}

export function judge(_spec: Spec, entry: StatedEntry, context: JudgeContext): Judged {
  return judgeStated(entry, context, { ...requires(), missing: "Add a scope picture or scope data first." });
}
