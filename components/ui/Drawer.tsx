"use client";

import clsx from "clsx";
import type { ReactElement, ReactNode } from "react";
import { Dialog, DialogTrigger, Heading, Modal, ModalOverlay } from "react-aria-components";
import { IconButton } from "./IconButton";

export type DrawerProps = {
  title: string;
  trigger?: ReactElement;
  isOpen?: boolean;
  onOpenChange?: (isOpen: boolean) => void;
  /** "side" is pulled from the right on a desktop and from below on a phone; "below" always from below. */
  from?: "side" | "below";
  children: ReactNode | ((close: () => void) => ReactNode);
};

const PLACES = {
  side: "sm:items-stretch sm:justify-end",
  below: "",
};

const SHAPES = {
  side: "max-h-[85dvh] rounded-t-lg [--from-y:24px] sm:max-h-none sm:max-w-md sm:rounded-none sm:rounded-l-lg sm:[--from-x:24px] sm:[--from-y:0]",
  below: "max-h-[85dvh] rounded-t-lg [--from-y:24px] sm:max-w-3xl",
};

export function Drawer({ title, trigger, from = "side", children, ...steering }: DrawerProps) {
  const overlay = (
    <ModalOverlay
      {...(trigger ? {} : steering)}
      isDismissable
      className={clsx("fixed inset-0 z-40 flex items-end justify-center bg-scrim", PLACES[from])}
    >
      <Modal className={clsx("motion-appear flex w-full flex-col bg-sheet shadow-float", SHAPES[from])}>
        <Dialog className="flex min-h-0 flex-1 flex-col outline-none">
          {({ close }) => (
            <>
              <header className="flex items-center justify-between gap-4 border-b border-rule px-5 py-2.5">
                <Heading slot="title" className="text-lg">
                  {title}
                </Heading>
                <IconButton icon="close" label="Close" tooltip={false} onPress={close} className="-mr-2" />
              </header>
              <div className="min-h-0 overflow-y-auto px-5 pb-[max(1.25rem,env(safe-area-inset-bottom))] pt-4">
                {typeof children === "function" ? children(close) : children}
              </div>
            </>
          )}
        </Dialog>
      </Modal>
    </ModalOverlay>
  );
  if (!trigger) return overlay;
  return (
    <DialogTrigger {...steering}>
      {trigger}
      {overlay}
    </DialogTrigger>
  );
}
