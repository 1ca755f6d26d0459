const TOLERANCE_MS = 5 * 60_000;

/**
 * When the attempt was carried out. A device whose clock runs ahead gets the server's time instead, and what it said
 * is kept in words.
 */
export function performedAt(said: Date, now: Date): { at: Date; sentence?: string } {
  if (said.getTime() <= now.getTime() + TOLERANCE_MS) return { at: said };
  return {
    at: now,
    sentence: `The device’s clock said ${said.toISOString()}, which had not come yet; the server’s time stands.`,
  };
}
