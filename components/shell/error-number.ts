/** The number under which the server logged an error, if it gave one. */
export function errorNumber(error: unknown): string | undefined {
  return error instanceof Error && "digest" in error && typeof error.digest === "string" ? error.digest : undefined;
}
