"use client";

import { ListBoxItem, Text } from "react-aria-components";
import { dropItem } from "./field-style";
import { Icon } from "./Icon";
import type { Option } from "./option";

export function OptionLine({ option }: { option: Option }) {
  return (
    <ListBoxItem id={option.id} textValue={option.label} isDisabled={option.isDisabled ?? false} className={dropItem}>
      {({ isSelected }) => (
        <>
          {option.mark}
          <span className="flex min-w-0 flex-col">
            <Text slot="label" className={isSelected ? "font-semibold" : ""}>
              {option.label}
            </Text>
            {option.description && (
              <Text slot="description" className="text-sm text-ink-soft">
                {option.description}
              </Text>
            )}
          </span>
          {isSelected && <Icon name="check" className="ml-auto text-copper" />}
        </>
      )}
    </ListBoxItem>
  );
}
