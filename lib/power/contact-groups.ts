import type { ContactLoad } from "@/lib/calc/power";

export type ContactGroup = Omit<ContactLoad, "placement" | "label"> & { labels: string[] };

/** Units of one design carry the same: one line for all that do, the most loaded first. */
export function contactGroups(loads: readonly ContactLoad[]): ContactGroup[] {
  const groups = new Map<string, ContactGroup>();
  for (const { placement: _placement, label, ...load } of loads) {
    const key = [load.rail, load.contacts, load.worstA, load.verdict].join(" ");
    const group = groups.get(key);
    if (group) group.labels.push(label);
    else groups.set(key, { ...load, labels: [label] });
  }
  return [...groups.values()].sort((a, b) => shareOf(b) - shareOf(a));
}

/** Of what one contact bears; without a contact more than any. */
export const shareOf = ({ perContactA, ratedA }: Pick<ContactLoad, "perContactA" | "ratedA">): number =>
  perContactA === null ? Infinity : perContactA / ratedA;
