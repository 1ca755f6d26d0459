"use client";

import clsx from "clsx";
import { useEffect, useState, useSyncExternalStore } from "react";
import { Button } from "./Button";
import { Icon } from "./Icon";
import { IconButton } from "./IconButton";
import { dismissToast, toastStore, type Toast } from "./toast-store";

/** Stands once in the root layout; anything calls `toast(…)`. Spoken politely, held while pointed at or focused. */
export function ToastRegion() {
  const toasts = useSyncExternalStore(toastStore.subscribe, toastStore.read, toastStore.readOnServer);
  const [isHeld, setHeld] = useState(false);
  return (
    <section
      aria-label="Messages"
      data-chrome
      onPointerEnter={() => setHeld(true)}
      onPointerLeave={() => setHeld(false)}
      onFocus={() => setHeld(true)}
      onBlur={() => setHeld(false)}
      className="pointer-events-none fixed inset-x-3 bottom-[calc(4.75rem+env(safe-area-inset-bottom))] z-50 flex flex-col items-center gap-2 sm:inset-x-auto sm:bottom-5 sm:left-5 sm:items-start"
    >
      <div role="status" className="contents">
        {toasts.map((entry) => (
          <ToastSlip key={entry.id} toast={entry} isHeld={isHeld} />
        ))}
      </div>
    </section>
  );
}

function ToastSlip({ toast, isHeld }: { toast: Toast; isHeld: boolean }) {
  useEffect(() => {
    if (isHeld || toast.milliseconds === null) return;
    const timer = setTimeout(() => dismissToast(toast.id), toast.milliseconds);
    return () => clearTimeout(timer);
  }, [isHeld, toast]);

  const { undo } = toast;
  return (
    <div className="motion-appear pointer-events-auto flex w-full max-w-md items-center gap-2.5 rounded-md bg-ink py-1.5 pl-3.5 pr-1.5 text-[0.9375rem] text-paper shadow-float [--from-y:10px]">
      {toast.kind !== "info" && <Icon name={toast.kind === "error" ? "caution" : "check"} />}
      <p className="min-w-0 flex-1 py-1.5">{toast.text}</p>
      {undo && (
        <Button
          kind="quiet"
          size="sm"
          className={slipButton}
          onPress={() => {
            dismissToast(toast.id);
            void undo.run();
          }}
        >
          {undo.label ?? "Undo"}
        </Button>
      )}
      <IconButton
        icon="close"
        label="Close the message"
        size="sm"
        tooltip={false}
        className={clsx(slipButton, "opacity-80")}
        onPress={() => dismissToast(toast.id)}
      />
    </div>
  );
}

const slipButton = "text-paper! underline-offset-4 hover:bg-paper/15! focus-visible:outline-paper";
