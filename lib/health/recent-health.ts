import { checkHealth, type Health } from "./check-health";

const FRESH_MS = 2_000;

let last: { at: number; health: Promise<Health> } | undefined;

/** Asked by anybody as often as they like, so the parts themselves are asked every two seconds at most. */
export function recentHealth(): Promise<Health> {
  if (!last || Date.now() - last.at > FRESH_MS) last = { at: Date.now(), health: checkHealth() };
  return last.health;
}
