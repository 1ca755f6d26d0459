import type { Judged, JudgeContext } from "../kind";
import { judgeStated, type StatedEntry } from "../stated-verdict";
import type { Spec } from "./schema";

export function judge(_spec: Spec, entry: StatedEntry, context: JudgeContext): Judged {
  return judgeStated(entry, context);
}
