const key = (userId: string, unit: string) => `boardwake-instrument:${userId}:${unit}`;
const watchers = new Set<() => void>();
/** What was chosen since the page opened; the only memory where storage is forbidden. */
const chosen = new Map<string, string>();

/** The instrument last used for readings in this unit, on this device: the same meter lies on the bench all evening. Empty: none. */
export function rememberedInstrument(userId: string, unit: string): string {
  const name = key(userId, unit);
  const now = chosen.get(name);
  if (now !== undefined) return now;
  try {
    return localStorage.getItem(name) ?? "";
  } catch {
    return "";
  }
}

export function rememberInstrument(userId: string, units: readonly string[], instrumentId: string): void {
  for (const unit of units) {
    const name = key(userId, unit);
    chosen.set(name, instrumentId);
    try {
      localStorage.setItem(name, instrumentId);
    } catch {
      // Remembered as long as the page.
    }
  }
  for (const watch of watchers) watch();
}

export function watchInstruments(watch: () => void): () => void {
  watchers.add(watch);
  return () => void watchers.delete(watch);
}
