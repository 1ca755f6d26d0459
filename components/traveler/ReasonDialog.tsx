"use client";

import { useRouter } from "next/navigation";
import { useRef, useState, type ReactElement, type ReactNode } from "react";
import { Button } from "@/components/ui/Button";
import { Dialog } from "@/components/ui/Dialog";
import { DialogActions } from "@/components/ui/DialogActions";
import { reach, type Refused, type Reply } from "@/components/ui/form/reply";
import { Notice } from "@/components/ui/Notice";
import { TextArea } from "@/components/ui/TextArea";
import { toast } from "@/components/ui/toast-store";

type Props = {
  title: string;
  trigger: ReactElement;
  /** What follows, in a sentence or two. */
  explanation: ReactNode;
  label: string;
  submitLabel: string;
  /** Said when it is done. */
  said: string;
  send: (reason: string, writeId: string) => Promise<Reply<unknown>>;
};

/** A decision that stays on the traveler asks for its reason. What was typed stays when the server says no. */
export function ReasonDialog({ title, trigger, ...rest }: Props) {
  return (
    <Dialog title={title} trigger={trigger} width="md">
      {(close) => <ReasonForm {...rest} onDone={close} />}
    </Dialog>
  );
}

function ReasonForm({
  explanation,
  label,
  submitLabel,
  said,
  send,
  onDone,
}: Omit<Props, "title" | "trigger"> & { onDone: () => void }) {
  const router = useRouter();
  const [reason, setReason] = useState("");
  const [isPending, setPending] = useState(false);
  const [refused, setRefused] = useState<Refused>();
  const writeId = useRef(crypto.randomUUID());
  const fieldError = refused?.fields?.reason;

  async function submit() {
    setPending(true);
    const reply = await reach(() => send(reason, writeId.current));
    setPending(false);
    if (!reply.ok) return setRefused(reply.error);
    toast({ text: said });
    onDone();
    router.refresh();
  }

  return (
    <form
      className="grid gap-4"
      onSubmit={(event) => {
        event.preventDefault();
        void submit();
      }}
    >
      <p className="text-ink-soft">{explanation}</p>
      <TextArea
        label={label}
        value={reason}
        onChange={setReason}
        rows={3}
        maxLength={2000}
        isRequired
        autoFocus
        error={fieldError}
      />
      {refused && !fieldError && <Notice kind="failed">{refused.message}</Notice>}
      <DialogActions>
        <Button slot="close">Cancel</Button>
        <Button type="submit" kind="primary" isPending={isPending} isDisabled={reason.trim() === ""}>
          {submitLabel}
        </Button>
      </DialogActions>
    </form>
  );
}
