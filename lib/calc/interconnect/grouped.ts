/** Items by name, each group in the items' order, groups in the order of their first item. */
export function grouped<T>(items: Iterable<T>, nameOf: (item: T) => string): Map<string, T[]> {
  const groups = new Map<string, T[]>();
  for (const item of items) {
    const name = nameOf(item);
    const same = groups.get(name);
    if (same) same.push(item);
    else groups.set(name, [item]);
  }
  return groups;
}
