import type { ReactNode } from "react";
import { Button } from "@/components/ui/Button";
import { counted } from "./counted";
import { Disclosure } from "./Disclosure";

type Props<Item> = {
  /** Of one: "archived block". */
  what: string;
  items: readonly Item[];
  keyOf: (item: Item) => string;
  nameOf: (item: Item) => string;
  /** Its name as it is shown, with a link where there is a page. */
  show: (item: Item) => ReactNode;
  /** Without it nobody may bring anything back. */
  restore?: ((item: Item) => void) | undefined;
};

/** What was put away, folded up, each with its way back. Nothing when there is nothing. */
export function ArchivedList<Item>({ what, items, keyOf, nameOf, show, restore }: Props<Item>) {
  if (items.length === 0) return null;
  return (
    <Disclosure summary={counted(items.length, what)}>
      <ul className="flex flex-col gap-2">
        {items.map((item) => (
          <li key={keyOf(item)} className="flex flex-wrap items-center gap-x-4 gap-y-1">
            {show(item)}
            {restore && (
              <Button size="sm" aria-label={`Restore ${nameOf(item)}`} onPress={() => restore(item)}>
                Restore
              </Button>
            )}
          </li>
        ))}
      </ul>
    </Disclosure>
  );
}
