"use client";

import type { ReactElement } from "react";
import { Tooltip as AriaTooltip, TooltipTrigger } from "react-aria-components";

/** A short name or a key for the control inside; never the only place where something is said. */
export function Tooltip({ text, keys, children }: { text: string; keys?: string; children: ReactElement }) {
  return (
    <TooltipTrigger delay={500} closeDelay={80}>
      {children}
      <AriaTooltip
        offset={6}
        className="motion-appear z-50 max-w-64 rounded bg-ink px-2 py-1 text-xs text-paper shadow-float"
      >
        {text}
        {keys && <kbd className="mono ml-2 text-2xs opacity-80">{keys}</kbd>}
      </AriaTooltip>
    </TooltipTrigger>
  );
}
