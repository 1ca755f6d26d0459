"use client";

import { useEffect, useRef, type ReactNode } from "react";

type Props = { title: string; onClose: () => void; children: ReactNode; wide?: boolean };

/**
 * The browser's own modal dialog: focus stays inside, Escape closes, focus goes back. Rises from the bottom on a
 * phone, where the thumb is. Shown while it is mounted.
 */
export function BottomSheet({ title, onClose, children, wide = false }: Props) {
  const dialog = useRef<HTMLDialogElement>(null);
  useEffect(() => {
    const shown = dialog.current;
    shown?.showModal();
    // The dialog takes its first button; who opened it to write wants the text.
    shown?.querySelector("textarea")?.focus();
    return () => shown?.close();
  }, []);
  return (
    <dialog
      ref={dialog}
      aria-label={title}
      onCancel={(event) => {
        event.preventDefault();
        onClose();
      }}
      onClick={(event) => {
        if (event.target === event.currentTarget) onClose();
      }}
      className={`bg-sheet text-ink shadow-float backdrop:bg-scrim m-0 mx-auto mt-auto max-h-[88dvh] w-full overflow-hidden rounded-t-lg p-0 sm:my-auto sm:rounded-lg ${wide ? "max-w-3xl" : "max-w-lg"}`}
    >
      <div className="flex max-h-[88dvh] flex-col">
        <header className="border-rule flex items-center justify-between gap-3 border-b py-2 pr-2 pl-4">
          <h2 className="text-lg">{title}</h2>
          <button
            type="button"
            onClick={onClose}
            className="hover:bg-copper-ground min-h-12 min-w-12 rounded px-3 font-semibold"
          >
            Close
          </button>
        </header>
        <div className="overflow-y-auto overscroll-contain p-4 pb-[max(1rem,env(safe-area-inset-bottom))]">
          {children}
        </div>
      </div>
    </dialog>
  );
}
