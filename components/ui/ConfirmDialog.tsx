"use client";

import { useState, type ReactElement, type ReactNode } from "react";
import { Button } from "./Button";
import { Dialog } from "./Dialog";
import { DialogActions } from "./DialogActions";
import { Notice } from "./Notice";

export type ConfirmDialogProps = {
  /** A question that names the thing: "Remove Ada from the project?" */
  title: string;
  trigger?: ReactElement;
  isOpen?: boolean;
  onOpenChange?: (isOpen: boolean) => void;
  /** What follows, one sentence a line. */
  consequences: readonly ReactNode[];
  /** The verb and its object: "Remove Ada". Never "OK". */
  confirmLabel: string;
  cancelLabel?: string;
  kind?: "danger" | "primary";
  /** Gives a sentence when it did not work; the dialog then stays and says it. */
  onConfirm: () => string | void | Promise<string | void>;
  children?: ReactNode;
};

export function ConfirmDialog(props: ConfirmDialogProps) {
  const [isPending, setPending] = useState(false);
  const [failure, setFailure] = useState<string>();

  async function confirm(close: () => void) {
    setPending(true);
    setFailure(undefined);
    try {
      const sentence = await props.onConfirm();
      if (sentence) setFailure(sentence);
      else close();
    } catch {
      setFailure("The server did not answer. Nothing was changed; try again when the network is back.");
    } finally {
      setPending(false);
    }
  }

  return (
    <Dialog
      title={props.title}
      role="alertdialog"
      width="sm"
      {...(props.trigger ? { trigger: props.trigger } : {})}
      {...(props.isOpen === undefined ? {} : { isOpen: props.isOpen })}
      {...(props.onOpenChange ? { onOpenChange: props.onOpenChange } : {})}
    >
      {(close) => (
        <>
          <ul className="flex flex-col gap-2 text-[0.9375rem]">
            {props.consequences.map((sentence, index) => (
              <li
                key={index}
                className="flex gap-2.5 before:mt-[0.6em] before:h-px before:w-3 before:shrink-0 before:bg-ink-soft"
              >
                <span>{sentence}</span>
              </li>
            ))}
          </ul>
          {props.children && <div className="mt-4">{props.children}</div>}
          {failure && (
            <Notice kind="failed" className="mt-4">
              {failure}
            </Notice>
          )}
          <DialogActions>
            <Button slot="close" isDisabled={isPending} autoFocus={props.kind !== "primary"}>
              {props.cancelLabel ?? "Keep it as it is"}
            </Button>
            <Button kind={props.kind ?? "danger"} isPending={isPending} onPress={() => void confirm(close)}>
              {props.confirmLabel}
            </Button>
          </DialogActions>
        </>
      )}
    </Dialog>
  );
}
