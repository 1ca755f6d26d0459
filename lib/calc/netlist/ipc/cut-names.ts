import { listed } from "../listed";

const COLUMNS = 14;

/**
 * One writer cuts a net's name after 14 characters, another keeps the last 14, neither with an alias: two nets can become one.
 * Nothing in the file tells, so that one has to look; sentences for the file as a whole.
 */
export function cutNameWarnings(names: readonly string[], longNames: Iterable<string>): string[] {
  const full = names.filter((name) => name.length === COLUMNS);
  const warnings: string[] = [];
  const stems = new Map<string, string[]>();
  for (const name of longNames) {
    if (name.length <= COLUMNS) continue;
    const stem = name.slice(0, COLUMNS);
    stems.set(stem, [...(stems.get(stem) ?? []), name]);
  }
  for (const [stem, alike] of stems) {
    if (alike.length > 1) {
      warnings.push(
        `${listed(alike)} begin with the same ${COLUMNS} characters: a program that cuts names makes one net of them.`,
      );
    }
    if (full.includes(stem)) warnings.push(`${stem} may be a part of ${listed(alike)} whose name was cut.`);
  }
  if (full.length > 0) {
    warnings.push(
      `${listed(full)} ${full.length === 1 ? "fills" : "fill"} all ${COLUMNS} columns of a name and may be cut: nets whose names begin or end alike may have become one.`,
    );
  }
  return warnings;
}
