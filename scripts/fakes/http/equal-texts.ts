import { createHmac, timingSafeEqual } from "node:crypto";

/** Compares secrets without telling by its duration how much of them agrees. */
export function equalTexts(one: string, other: string): boolean {
  const digest = (text: string) => createHmac("sha256", "compare").update(text).digest();
  return timingSafeEqual(digest(one), digest(other));
}
