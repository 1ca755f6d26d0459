/** The instrument last used for readings of a unit of measure, on this device: the same meter lies on the bench all evening. */
const key = (userId: string, unit: string) => `boardwake-instrument:${userId}:${unit}`;

export function rememberedInstrument(userId: string, unit: string): string | null {
  try {
    return localStorage.getItem(key(userId, unit));
  } catch {
    return null;
  }
}

export function rememberInstrument(userId: string, unit: string, instrumentId: string | null): void {
  try {
    if (instrumentId) localStorage.setItem(key(userId, unit), instrumentId);
    else localStorage.removeItem(key(userId, unit));
  } catch {
    // Remembered as long as the page.
  }
}
