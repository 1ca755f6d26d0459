"use client";

import { useRouter } from "next/navigation";
import { useTransition } from "react";
import { reach, type Reply } from "@/components/ui/form/reply";
import { toast } from "@/components/ui/toast-store";

/** A button's act: done, said, shown again. With `undo` the message can take it back. */
export function useAct() {
  const router = useRouter();
  const [isPending, start] = useTransition();

  async function act<Value>(
    call: () => Promise<Reply<Value>>,
    said: (value: Value) => string,
    undo?: () => Promise<unknown>,
  ): Promise<string | undefined> {
    const reply = await reach(call);
    if (!reply.ok) {
      toast({ text: reply.error.message, kind: "error" });
      return reply.error.message;
    }
    toast({ text: said(reply.value), ...(undo ? { undo: { run: async () => void (await undo()) } } : {}) });
    start(() => router.refresh());
    return undefined;
  }

  return { act, isPending };
}
