/**
 * To be called when somebody signs out: bench pages kept on this device go. Attempts that have not been sent stay,
 * unseen by others, until the person who made them signs in again.
 */
export async function forgetDevice(): Promise<void> {
  try {
    const names = await caches.keys();
    await Promise.all(
      names.filter((name) => name.startsWith("boardwake-bench-pages")).map((name) => caches.delete(name)),
    );
  } catch {
    // No cache storage (an insecure address, a private window): then nothing was kept.
  }
}
