"use client";

import { createContext, useContext, type ReactNode } from "react";

/** On a phone the pad stands open for the check one is entering; beside the sheet of a wide screen it always does. */
export const Pad = createContext<{ isOpen: boolean; open: () => void }>({ isOpen: true, open: () => undefined });

export function PadSlot({ children }: { children: ReactNode }) {
  return <div className={useContext(Pad).isOpen ? "" : "max-lg:hidden"}>{children}</div>;
}
