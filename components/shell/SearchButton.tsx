"use client";

import { Button } from "react-aria-components";
import { Icon } from "../ui/Icon";
import { Kbd } from "../ui/Kbd";

/** Looks like the field it opens; on a phone only its lens remains. */
export function SearchButton({ onPress, keys = "/" }: { onPress: () => void; keys?: string }) {
  return (
    <Button
      aria-label="Search the project"
      aria-keyshortcuts={keys}
      onPress={onPress}
      className="flex size-10 items-center justify-center gap-2 rounded-md text-sm text-ink-soft hover:text-ink max-lg:hover:bg-ink/8 lg:h-9 lg:w-48 lg:justify-start lg:border lg:border-edge lg:bg-raised lg:px-2.5 lg:hover:border-ink-soft"
    >
      <Icon name="search" />
      <span className="flex-1 text-left max-lg:hidden">Search</span>
      <Kbd className="max-lg:hidden">{keys}</Kbd>
    </Button>
  );
}
