"use client";

import { Button } from "react-aria-components";
import { Avatar } from "../ui/Avatar";
import { Menu, type MenuEntry } from "../ui/Menu";

export type AccountMenuProps = { name: string; email?: string; entries: readonly MenuEntry[] };

export function AccountMenu({ name, email, entries }: AccountMenuProps) {
  return (
    <Menu
      label="Account"
      entries={entries}
      header={
        <>
          <p className="truncate font-semibold">{name}</p>
          {email && <p className="truncate text-sm text-ink-soft">{email}</p>}
        </>
      }
      trigger={
        <Button
          aria-label={`Account of ${name}`}
          className="flex size-10 items-center justify-center rounded-md hover:bg-ink/8"
        >
          <Avatar name={name} />
        </Button>
      }
    />
  );
}
