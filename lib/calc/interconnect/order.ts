const isDigit = (code: number) => code >= 48 && code <= 57;

/** Natural order, the same on every machine and in every language: a2 before a10, D7 before D10. */
export function byName(one: string, other: string): number {
  let i = 0;
  let k = 0;
  while (i < one.length && k < other.length) {
    const [a, b] = [one.charCodeAt(i), other.charCodeAt(k)];
    if (isDigit(a) && isDigit(b)) {
      const [endA, endB] = [endOfNumber(one, i), endOfNumber(other, k)];
      const difference = Number(one.slice(i, endA)) - Number(other.slice(k, endB));
      if (difference !== 0) return difference;
      [i, k] = [endA, endB];
    } else if (a !== b) {
      return a - b;
    } else {
      i += 1;
      k += 1;
    }
  }
  const rest = one.length - i - (other.length - k);
  return rest !== 0 ? rest : plainly(one, other);
}

function endOfNumber(text: string, from: number): number {
  let end = from;
  while (end < text.length && isDigit(text.charCodeAt(end))) end += 1;
  return end;
}

const plainly = (one: string, other: string): number => (one < other ? -1 : one > other ? 1 : 0);

/**
 * By name, each name once. Where two things claim one name the first by content stays, so that the answer does not
 * depend on the order in which they came.
 */
export function sortedOnce<T>(list: readonly T[], nameOf: (item: T) => string): T[] {
  const sorted = list
    .map((item) => ({ item, name: nameOf(item) }))
    .sort((a, b) => byName(a.name, b.name) || plainly(JSON.stringify(a.item), JSON.stringify(b.item)));
  return sorted.filter(({ name }, at) => at === 0 || name !== sorted[at - 1]?.name).map(({ item }) => item);
}

/** Distinct names in natural order. */
export const distinct = (names: Iterable<string>): string[] => [...new Set(names)].sort(byName);
