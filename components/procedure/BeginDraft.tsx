"use client";

import { useRouter } from "next/navigation";
import { useRef, useState } from "react";
import { Button } from "@/components/ui/Button";
import { Panel } from "@/components/ui/Panel";
import { RadioGroup } from "@/components/ui/RadioGroup";
import { useSubmit } from "@/components/ui/form/useSubmit";
import { Notice } from "@/components/ui/Notice";
import type { ProcedureActs, StarterChoice } from "./procedure-acts";

type Props = {
  project: string;
  board: string;
  kind: "first" | "next";
  newest: number | undefined;
  starters: readonly StarterChoice[];
  start: ProcedureActs["start"];
};

/** Where a draft comes from. A starter is copied: what becomes of it is the maintainer's. */
export function BeginDraft({ project, board, kind, newest, starters, start }: Props) {
  const router = useRouter();
  const writeId = useRef(crypto.randomUUID());
  const [from, setFrom] = useState<string>(kind === "next" ? "issued" : (starters[1]?.id ?? "scratch"));
  const { submit, isPending, error } = useSubmit(start, {
    onDone: () => router.refresh(),
  });
  const options = [
    ...(kind === "next"
      ? [
          {
            id: "issued",
            label: `Version ${newest ?? ""}`,
            description: "Checks keep their identity, so travelers can be moved over with their attempts.",
          },
        ]
      : []),
    ...starters.map(({ id, name, description, checks }) => ({
      id,
      label: `Starter: ${name}`,
      description: `${description} ${checks} checks.`,
    })),
    { id: "scratch", label: "From scratch", description: "An empty list." },
  ];
  const chosen = [...starters.map(({ id }) => id), "issued" as const, "scratch" as const].find((id) => id === from);
  return (
    <Panel title={kind === "next" ? "Begin the next version" : "Write the procedure"}>
      <RadioGroup
        label="Begin with"
        description="A starter is written from trade practice and is yours to change: limits, order, every word."
        value={from}
        onChange={setFrom}
        options={options}
      />
      {error && (
        <Notice kind="error" className="mt-3">
          {error.message}
        </Notice>
      )}
      <div className="mt-4">
        <Button
          kind="primary"
          isPending={isPending}
          onPress={() => chosen && void submit({ project, board, writeId: writeId.current, from: chosen })}
        >
          Begin the draft
        </Button>
      </div>
    </Panel>
  );
}
