/** "A", "A and B", "A, B and C", "A, B, C, D and 96 more". */
export function listed(names: readonly string[], most = 4): string {
  const shown = names.length > most + 1 ? [...names.slice(0, most), `${names.length - most} more`] : [...names];
  const last = shown.pop() ?? "";
  return shown.length === 0 ? last : `${shown.join(", ")} and ${last}`;
}
