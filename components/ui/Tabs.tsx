"use client";

import clsx from "clsx";
import type { ReactNode } from "react";
import { Tab, TabList, TabPanel, Tabs as AriaTabs } from "react-aria-components";
import { tabLook, tabRow } from "./tab-style";

export type TabsProps = {
  label: string;
  tabs: readonly { id: string; label: ReactNode; content: ReactNode }[];
  selected?: string;
  onSelect?: (id: string) => void;
  className?: string;
};

/** Faces of one thing on one page. Where each face has an address of its own, use LinkTabs. */
export function Tabs({ label, tabs, selected, onSelect, className }: TabsProps) {
  return (
    <AriaTabs
      {...(selected === undefined ? {} : { selectedKey: selected })}
      onSelectionChange={(key) => onSelect?.(String(key))}
      className={clsx("flex min-w-0 flex-col gap-4", className)}
    >
      <TabList aria-label={label} className={tabRow}>
        {tabs.map((tab) => (
          <Tab key={tab.id} id={tab.id} className={({ isSelected }) => clsx(tabLook(isSelected), "cursor-pointer")}>
            {tab.label}
          </Tab>
        ))}
      </TabList>
      {tabs.map((tab) => (
        <TabPanel key={tab.id} id={tab.id} className="min-w-0">
          {tab.content}
        </TabPanel>
      ))}
    </AriaTabs>
  );
}
