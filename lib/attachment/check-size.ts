import type { AttachmentKind } from "@/db/schema/evidence";
import { ok, refuse, type Answer } from "@/lib/actions/answer";
import { largestBytes, sizeText } from "@/lib/storage/limits";

/** Whether a file of this size can be one of these kinds. */
export function checkSize(name: string, bytes: number, kinds: readonly AttachmentKind[]): Answer<void> {
  if (!Number.isInteger(bytes) || bytes < 0)
    return refuse("invalid", `The size of ${name} is missing. Nothing was kept.`);
  if (bytes === 0) return refuse("invalid", `${name} is empty (0 bytes). Nothing was kept.`);
  const most = largestBytes(kinds);
  if (bytes <= most) return ok(undefined);
  const sizes = `${name} has ${sizeText(bytes)}; the most that can be kept here is ${sizeText(most)}`;
  return refuse("too-large", `${sizes}. Nothing was kept.`);
}
