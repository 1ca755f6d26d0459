import { writeDate } from "@/components/ui/DateTime";

/** Runs of things that happened on one day of the reader's zone, in the order given. */
export function byDay<Item extends { at: string }>(
  items: readonly Item[],
  zone: string,
): { label: string; items: Item[] }[] {
  const days: { label: string; items: Item[] }[] = [];
  for (const item of items) {
    const label = writeDate(item.at, zone, "day");
    const last = days.at(-1);
    if (last?.label === label) last.items.push(item);
    else days.push({ label, items: [item] });
  }
  return days;
}
