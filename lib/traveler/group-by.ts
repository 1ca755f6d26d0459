/** Rows by a key of theirs, in their order; rows without the key are left out. */
export function groupBy<Row, Key>(rows: readonly Row[], keyOf: (row: Row) => Key | null): Map<Key, Row[]> {
  const groups = new Map<Key, Row[]>();
  for (const row of rows) {
    const key = keyOf(row);
    if (key === null) continue;
    const group = groups.get(key);
    if (group) group.push(row);
    else groups.set(key, [row]);
  }
  return groups;
}
