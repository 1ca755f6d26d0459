const collator = new Intl.Collator("en", { numeric: true });

/** CON-02 before CON-10; names that read the same go by their characters. */
export const byName = (one: string, other: string): number =>
  collator.compare(one, other) || (one < other ? -1 : one > other ? 1 : 0);
