"use client";

import { useRouter } from "next/navigation";
import { useState } from "react";
import { z } from "zod";
import { reach, type Refused, type Reply } from "@/components/ui/form/reply";
import { toast } from "@/components/ui/toast-store";
import type { CheckRow } from "@/lib/procedure/check-row";
import type { ProcedureView } from "@/lib/procedure/load-procedure";

type Asked = { project: string; board: string; version: number; writeId: string };
type RefusedWithDetails = Refused & { details?: Record<string, unknown> };

const names = z.array(z.string());
const stale = z.object({
  current: z.object({
    version: z.int(),
    checks: z.array(
      z.object({
        key: z.string(),
        position: z.number(),
        stage: z.enum(["inspection", "continuity", "power-on", "function", "integration"]),
        title: z.string(),
        instruction: z.string(),
        caution: z.string(),
        reference: z.string(),
        holdPoint: z.boolean(),
        kind: z.string(),
        spec: z.unknown(),
        covers: z.object({ signals: names, pins: names, rails: names, blocks: names }),
        needs: names,
      }),
    ),
  }),
});

/**
 * The draft as this page knows it: its version goes with every change and comes back with every answer. When somebody
 * else was quicker, their draft is taken in (nothing typed is lost, the form stays open) and the change can be repeated.
 */
export function useDraftState(project: string, board: string, draft: NonNullable<ProcedureView["draft"]>) {
  const router = useRouter();
  const [version, setVersion] = useState(draft.version);
  const [checks, setChecks] = useState<CheckRow[]>(draft.checks);
  const [seen, setSeen] = useState(draft);

  // The page was loaded again: what the server says now replaces what was known.
  if (seen !== draft) {
    setSeen(draft);
    setVersion(draft.version);
    setChecks(draft.checks);
  }

  async function send<Value>(
    call: (asked: Asked) => Promise<Reply<Value>>,
    done?: (value: Value) => void,
  ): Promise<Reply<Value>> {
    const reply = await reach(() => call({ project, board, version, writeId: crypto.randomUUID() }));
    if (reply.ok) {
      const { value } = reply;
      if (value && typeof value === "object" && "version" in value && typeof value.version === "number")
        setVersion(value.version);
      done?.(value);
      router.refresh();
      return reply;
    }
    const { details }: RefusedWithDetails = reply.error;
    const theirs = stale.safeParse(details);
    if (theirs.success) {
      setVersion(theirs.data.current.version);
      setChecks(theirs.data.current.checks);
    } else if (!reply.error.fields) {
      toast({ text: reply.error.message, kind: "error" });
    }
    return reply;
  }

  return { checks, setChecks, send };
}
