"use client";

import { useRouter } from "next/navigation";
import type { z } from "zod";
import { Button } from "@/components/ui/Button";
import type { Reply } from "@/components/ui/form/reply";
import { useSubmit } from "@/components/ui/form/useSubmit";
import { Notice } from "@/components/ui/Notice";
import { counted } from "@/components/workshop/counted";
import type { askAgainInput } from "@/lib/probing/schema";

export type AskAct = (input: z.input<typeof askAgainInput>) => Promise<Reply<{ added: number }>>;

type Props = { project: string; plan: string; count: number; ask: AskAct };

/** Probes that the answers call for: they come behind the others, and the bench opens with the first of them. */
export function AskAgain({ project, plan, count, ask }: Props) {
  const router = useRouter();
  const { submit, isPending, error } = useSubmit(ask, {
    onDone: () => router.push(`/projects/${project}/probe/${plan}`),
  });
  return (
    <Notice
      kind="doubtful"
      title={`${counted(count, "more probe")} would tell what this is`}
      actions={
        <Button
          size="sm"
          isPending={isPending}
          onPress={() => void submit({ project, plan, writeId: crypto.randomUUID() })}
        >
          Probe {count === 1 ? "it" : "them"}
        </Button>
      }
    >
      Open nets are held against each other: crossed wires look like opens until then.
      {error && <p className="font-semibold text-failed">{error.message}</p>}
    </Notice>
  );
}
