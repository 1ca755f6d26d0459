/** What the server tells when two people recorded the same check: both are kept, the later one counts. */
export function overtakenBy(answer: unknown): string | undefined {
  if (typeof answer !== "object" || answer === null || !("overtook" in answer)) return undefined;
  const { overtook } = answer;
  if (typeof overtook !== "object" || overtook === null || !("by" in overtook) || !("summary" in overtook))
    return undefined;
  return `${String(overtook.by)} recorded this check just before you: ${String(overtook.summary)}. Both are kept; yours came later and counts.`;
}
