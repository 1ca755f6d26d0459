"use client";

import { useEffect, useRef, type ReactNode } from "react";
import { Icon } from "@/components/ui/Icon";

type Props = { title: string | undefined; onClose: () => void; children: ReactNode };

/** Beside the rows on a desktop; on a phone a sheet over the whole screen while a check is open. */
export function DetailFrame({ title, onClose, children }: Props) {
  const heading = useRef<HTMLHeadingElement>(null);
  const isOpen = title !== undefined;
  useEffect(() => {
    if (!isOpen || !matchMedia("(max-width: 63.99rem)").matches) return;
    heading.current?.focus();
    const onKeyDown = (event: KeyboardEvent) =>
      event.key === "Escape" && !document.querySelector("[role=dialog]") && onClose();
    addEventListener("keydown", onKeyDown);
    document.documentElement.classList.add("max-lg:overflow-hidden");
    return () => {
      removeEventListener("keydown", onKeyDown);
      document.documentElement.classList.remove("max-lg:overflow-hidden");
    };
  }, [isOpen, onClose]);
  return (
    <aside
      aria-label="Check"
      className={
        isOpen
          ? "border-rule bg-sheet max-lg:fixed max-lg:inset-0 max-lg:z-30 max-lg:overflow-y-auto lg:sticky lg:top-4 lg:max-h-[calc(100dvh-2rem)] lg:overflow-y-auto lg:rounded-lg lg:border"
          : "border-rule bg-sheet hidden rounded-lg border border-dashed lg:sticky lg:top-4 lg:block"
      }
    >
      {isOpen && (
        <header className="border-rule bg-sheet sticky top-0 z-10 flex items-start justify-between gap-2 border-b py-2 pr-2 pl-5">
          <h2 ref={heading} tabIndex={-1} className="py-2 text-lg outline-none">
            {title}
          </h2>
          <button
            type="button"
            aria-label="Close the check"
            onClick={onClose}
            className="hover:bg-copper-ground grid size-11 shrink-0 place-items-center rounded"
          >
            <Icon name="close" />
          </button>
        </header>
      )}
      {children}
    </aside>
  );
}
