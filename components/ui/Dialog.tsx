"use client";

import clsx from "clsx";
import type { ReactElement, ReactNode } from "react";
import { Dialog as AriaDialog, DialogTrigger, Heading, Modal, ModalOverlay } from "react-aria-components";
import { IconButton } from "./IconButton";

export type DialogProps = {
  title: string;
  /** The control that opens it. Without one, steer it with `isOpen` and `onOpenChange`. */
  trigger?: ReactElement;
  isOpen?: boolean;
  onOpenChange?: (isOpen: boolean) => void;
  width?: "sm" | "md" | "lg";
  role?: "dialog" | "alertdialog";
  /** False while something runs that a press beside the dialog must not cut off. */
  isDismissable?: boolean;
  children: ReactNode | ((close: () => void) => ReactNode);
};

const WIDTHS = { sm: "sm:max-w-md", md: "sm:max-w-xl", lg: "sm:max-w-4xl" };

/** A slip of paper laid on the sheet. On a phone it stands on the lower edge, in reach of the thumb. */
export function Dialog({ trigger, ...rest }: DialogProps) {
  if (!trigger) return <DialogModal {...rest} />;
  const steering = rest.isOpen === undefined ? {} : { isOpen: rest.isOpen };
  return (
    <DialogTrigger {...steering} {...(rest.onOpenChange ? { onOpenChange: rest.onOpenChange } : {})}>
      {trigger}
      <DialogModal {...rest} isOpen={undefined} onOpenChange={undefined} />
    </DialogTrigger>
  );
}

type Loose<T> = { [Key in keyof T]: T[Key] | undefined };

function DialogModal(
  props: Loose<Omit<DialogProps, "trigger" | "title" | "children">> & Pick<DialogProps, "title" | "children">,
) {
  const { title, width = "md", role = "dialog", isDismissable = true, children } = props;
  return (
    <ModalOverlay
      {...(props.isOpen === undefined ? {} : { isOpen: props.isOpen })}
      {...(props.onOpenChange ? { onOpenChange: props.onOpenChange } : {})}
      isDismissable={isDismissable && role === "dialog"}
      className="fixed inset-0 z-40 flex items-end justify-center bg-scrim sm:items-center sm:p-6"
    >
      <Modal
        className={clsx(
          "motion-appear flex max-h-[92dvh] w-full flex-col rounded-t-lg bg-sheet shadow-float [--from-y:12px] sm:rounded-lg",
          WIDTHS[width],
        )}
      >
        <AriaDialog role={role} className="flex min-h-0 flex-col outline-none">
          {({ close }) => (
            <>
              <header className="flex items-start justify-between gap-4 border-b border-rule px-5 pb-3 pt-4">
                <Heading slot="title" className="text-xl">
                  {title}
                </Heading>
                {role === "dialog" && (
                  <IconButton icon="close" label="Close" tooltip={false} onPress={close} className="-mr-2 -mt-1.5" />
                )}
              </header>
              <div className="min-h-0 overflow-y-auto px-5 pb-[max(1.25rem,env(safe-area-inset-bottom))] pt-4">
                {typeof children === "function" ? children(close) : children}
              </div>
            </>
          )}
        </AriaDialog>
      </Modal>
    </ModalOverlay>
  );
}
