"use client";

import { useRef, useState } from "react";
import type { Refused, Reply } from "@/components/ui/form/reply";

type Versioned = { version: number };
type Asked = { writeId: string; version: number };
type RefusedWithDetails = Refused & { details?: Record<string, unknown> };

/**
 * The version and the write id of one edit form. After a conflict it holds what somebody else saved, and the next save
 * is made against that version: what was typed stays, and overwriting is a decision, not an accident.
 */
export function useStaleEdit<Current extends Versioned>(
  version: number,
  read: (details: unknown) => Current | undefined,
) {
  const [theirs, setTheirs] = useState<Current>();
  const asked = useRef<Asked>({ writeId: crypto.randomUUID(), version });

  async function send<Value extends object>(save: (asked: Asked) => Promise<Reply<Value>>): Promise<Reply<Value>> {
    const reply = await save(asked.current);
    if (reply.ok) {
      const { value } = reply;
      const saved = "version" in value && typeof value.version === "number" ? value.version : asked.current.version;
      asked.current = { writeId: crypto.randomUUID(), version: saved };
      setTheirs(undefined);
      return reply;
    }
    const { details }: RefusedWithDetails = reply.error;
    const current = reply.error.code === "conflict" ? read(details?.current) : undefined;
    if (current) {
      asked.current = { writeId: crypto.randomUUID(), version: current.version };
      setTheirs(current);
    }
    return reply;
  }

  return { theirs, send };
}
