/** How long a builder may void an attempt of their own; later a maintainer must. */
export const VOID_WINDOW_MS = 10 * 60_000;

/** Whether a builder who is not a maintainer may still void it; buttons ask the same. */
export function mayVoid(attempt: { isOwn: boolean; recordedAt: Date }, now: Date): boolean {
  return attempt.isOwn && now.getTime() - attempt.recordedAt.getTime() <= VOID_WINDOW_MS;
}
