import type { Judged, JudgeContext, Requires } from "../kind";
import { judgeStated, type StatedEntry } from "../stated-verdict";
import type { Spec } from "./schema";

export function requires(spec: Spec): Requires {
  return { kinds: ["photo"], minimum: spec.minimum };
}

export function judge(spec: Spec, entry: StatedEntry, context: JudgeContext): Judged {
  const missing = spec.minimum === 1 ? "Take a photo first." : `Take ${spec.minimum} photos first.`;
  return judgeStated(entry, context, { ...requires(spec), missing });
}
