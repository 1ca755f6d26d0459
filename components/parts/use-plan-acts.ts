"use client";

import { useState } from "react";
import type { Reply } from "@/components/ui/form/reply";
import type { BoardPlanActs } from "./parts-acts";

type Versioned = { version: number };

/**
 * The three parts of a plan raise one version. What this page itself saved is no stranger's change: a form that stays
 * open with something typed goes on from the version that another part of the page made.
 */
export function usePlanActs(acts: BoardPlanActs): BoardPlanActs {
  const [own, setOwn] = useState(0);
  const follow =
    <Input extends Versioned, Value extends Versioned>(act: (input: Input) => Promise<Reply<Value>>) =>
    async (input: Input): Promise<Reply<Value>> => {
      const reply = await act({ ...input, version: Math.max(input.version, own) });
      if (reply.ok) setOwn(reply.value.version);
      return reply;
    };
  return { save: follow(acts.save), saveBom: follow(acts.saveBom), tie: follow(acts.tie) };
}
