/** A setting of a fake from its environment: secrets stay out of the process list that way. */
export function setting(name: string, fallback?: string): string {
  const value = process.env[name] ?? fallback;
  if (value !== undefined && value !== "") return value;
  console.error(`${name} is missing.`);
  process.exit(1);
}

export function portSetting(name: string, fallback?: string): number {
  const port = Number(setting(name, fallback));
  if (Number.isInteger(port) && port > 0 && port < 65_536) return port;
  console.error(`${name} should be a port number.`);
  process.exit(1);
}

/** Loopback, except in a container, whose port is published on loopback. */
export const host = () => setting("FAKE_HOST", "127.0.0.1");

export function endOnSignals(close: () => void): void {
  for (const signal of ["SIGINT", "SIGTERM", "SIGHUP"] as const) {
    process.on(signal, () => {
      close();
      setTimeout(() => process.exit(0), 200);
    });
  }
}
