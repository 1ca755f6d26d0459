"use client";

import { useWriteId } from "@/components/account/use-write-id";
import { Button } from "@/components/ui/Button";
import type { Reply } from "@/components/ui/form/reply";
import { useSubmit } from "@/components/ui/form/useSubmit";
import { toast } from "@/components/ui/toast-store";

type Props = {
  project: string;
  send: (input: { project: string; writeId: string }) => Promise<Reply<{ email: string }>>;
};

export function SendToMe({ project, send }: Props) {
  const { writeId, renew } = useWriteId();
  const { submit, isPending, error } = useSubmit(send, {
    onDone: ({ email }) => {
      renew();
      toast({ text: `Sent to ${email}.` });
    },
  });
  return (
    <div className="flex flex-col items-end gap-1.5">
      <Button kind="primary" isPending={isPending} onPress={() => void submit({ project, writeId })}>
        Send it to me
      </Button>
      {error && (
        <p role="alert" className="max-w-xs text-sm text-failed">
          {error.message}
        </p>
      )}
    </div>
  );
}
