"use client";

import type { ReactNode } from "react";
import { Button, DropIndicator, GridList, GridListItem, useDragAndDrop } from "react-aria-components";
import clsx from "clsx";
import { Icon } from "./Icon";

export type ReorderListProps<Item extends { id: string }> = {
  /** What is being put in order. */
  label: string;
  items: readonly Item[];
  /** Said when an item is taken by keyboard. */
  nameOf: (item: Item) => string;
  onReorder: (ids: string[]) => void;
  children: (item: Item) => ReactNode;
  isDisabled?: boolean;
  className?: string;
};

/** By pointer: pull the grip. By keyboard: Enter on the grip, arrows, Enter to lay down, Escape to leave it. */
export function ReorderList<Item extends { id: string }>(props: ReorderListProps<Item>) {
  const { label, items, nameOf, onReorder, children, isDisabled = false, className } = props;
  const byId = new Map(items.map((item) => [item.id, item]));
  const { dragAndDropHooks } = useDragAndDrop({
    isDisabled,
    getItems: (keys) =>
      [...keys].map((key) => {
        const item = byId.get(String(key));
        return { "text/plain": item ? nameOf(item) : "" };
      }),
    onReorder: ({ keys, target }) => {
      onReorder(
        moved(
          items.map((item) => item.id),
          new Set([...keys].map(String)),
          String(target.key),
          target.dropPosition,
        ),
      );
    },
    renderDropIndicator: (target) => <DropIndicator target={target} className={line} />,
  });
  return (
    <GridList
      aria-label={label}
      items={items}
      dependencies={[children]}
      dragAndDropHooks={dragAndDropHooks}
      className={clsx("flex flex-col [&>[role=row]:not(:last-child)]:mb-1.5", className)}
    >
      {(item) => (
        <GridListItem
          id={item.id}
          textValue={nameOf(item)}
          className="flex items-center gap-2 rounded-md border border-rule bg-raised py-1 pl-1 pr-3 data-dragging:opacity-50"
        >
          {!isDisabled && (
            <Button
              slot="drag"
              aria-label={`Move ${nameOf(item)}`}
              className="flex size-9 shrink-0 cursor-grab items-center justify-center rounded text-ink-soft hover:bg-ink/8"
            >
              <Icon name="grip" />
            </Button>
          )}
          <div className="min-w-0 flex-1">{children(item)}</div>
        </GridListItem>
      )}
    </GridList>
  );
}

/** Takes no room, so nothing jumps while one looks for the place. */
const line =
  "relative h-0 outline-none after:absolute after:inset-x-0 after:-top-[5px] after:h-1 after:rounded-full data-drop-target:after:bg-copper";

/** The order after the taken ids were laid down beside the target. */
export function moved(
  order: string[],
  taken: ReadonlySet<string>,
  target: string,
  side: "before" | "after" | "on",
): string[] {
  const lifted = order.filter((id) => taken.has(id));
  const rest = order.filter((id) => !taken.has(id));
  const index = rest.indexOf(target);
  if (index < 0) return order;
  const place = side === "after" ? index + 1 : index;
  return [...rest.slice(0, place), ...lifted, ...rest.slice(place)];
}
