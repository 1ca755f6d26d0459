/** Problems under a path, with the path cut off: what the kind's own form expects. */
export function under(problems: Record<string, string>, path: string): Record<string, string> {
  return Object.fromEntries(
    Object.entries(problems)
      .filter(([name]) => name.startsWith(path))
      .map(([name, sentence]) => [name.slice(path.length), sentence]),
  );
}

export const firstUnder = (problems: Record<string, string>, path: string): string | undefined =>
  Object.values(under(problems, path))[0];
