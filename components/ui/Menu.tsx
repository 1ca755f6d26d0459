"use client";

import clsx from "clsx";
import type { ReactElement, ReactNode } from "react";
import {
  Menu as AriaMenu,
  MenuItem,
  MenuTrigger,
  Popover,
  Separator,
  Text,
  type Selection,
} from "react-aria-components";
import { dropItem, dropList } from "./field-style";
import { Icon, type IconName } from "./Icon";

export type MenuEntry =
  | "line"
  | {
      id: string;
      label: string;
      description?: string;
      icon?: IconName;
      mark?: ReactNode;
      href?: string;
      onAction?: () => void;
      isDanger?: boolean;
      isDisabled?: boolean;
    };

export type MenuProps = {
  /** Names the menu for assistive technology. */
  label: string;
  trigger: ReactElement;
  entries: readonly MenuEntry[];
  /** With it the entries are a choice of one, and the chosen one is marked. */
  selected?: string;
  onSelect?: (id: string) => void;
  placement?: "bottom start" | "bottom end" | "top end";
  header?: ReactNode;
};

export function Menu({ label, trigger, entries, selected, onSelect, placement = "bottom end", header }: MenuProps) {
  const choice =
    selected === undefined
      ? {}
      : { selectionMode: "single" as const, selectedKeys: [selected], disallowEmptySelection: true };
  const report = (keys: Selection) => {
    if (keys !== "all") keys.forEach((key) => onSelect?.(String(key)));
  };
  return (
    <MenuTrigger>
      {trigger}
      <Popover placement={placement} offset={4} className={clsx(dropList, "w-64 max-w-[calc(100vw-1rem)]")}>
        {header && <div className="border-b border-rule px-2.5 pb-2 pt-1.5">{header}</div>}
        <AriaMenu aria-label={label} className="outline-none" {...choice} onSelectionChange={report}>
          {entries.map((entry, index) =>
            entry === "line" ? (
              <Separator key={index} className="my-1 border-t border-rule" />
            ) : (
              <MenuItem
                key={entry.id}
                id={entry.id}
                textValue={entry.label}
                isDisabled={entry.isDisabled ?? false}
                {...(entry.href ? { href: entry.href } : {})}
                onAction={() => entry.onAction?.()}
                className={clsx(dropItem, entry.isDanger && "text-failed!")}
              >
                {({ isSelected }) => (
                  <>
                    {entry.icon && <Icon name={entry.icon} className={entry.isDanger ? "" : "text-ink-soft"} />}
                    {entry.mark}
                    <span className="flex flex-col">
                      <Text slot="label" className={isSelected ? "font-semibold" : ""}>
                        {entry.label}
                      </Text>
                      {entry.description && (
                        <Text slot="description" className="text-sm text-ink-soft">
                          {entry.description}
                        </Text>
                      )}
                    </span>
                    {isSelected && <Icon name="check" className="ml-auto text-copper" />}
                  </>
                )}
              </MenuItem>
            ),
          )}
        </AriaMenu>
      </Popover>
    </MenuTrigger>
  );
}
