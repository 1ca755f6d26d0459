"use client";

import { createContext, useContext, type ReactNode } from "react";

/** Whether the pad stands open; the frame of the bench decides, so that it stays as it is from check to check. */
export const PadOpen = createContext<"auto" | "open" | "shut">("auto");

const SHOWN = { auto: "max-lg:[@media(max-height:760px)]:hidden", open: "", shut: "hidden" };

export function PadSlot({ children }: { children: ReactNode }) {
  return <div className={SHOWN[useContext(PadOpen)]}>{children}</div>;
}
