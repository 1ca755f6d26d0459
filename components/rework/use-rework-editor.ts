"use client";

import { useRouter } from "next/navigation";
import { useEffect, useRef, useState } from "react";
import { reach, type Refused } from "@/components/ui/form/reply";
import { toast } from "@/components/ui/toast-store";
import { fieldErrors } from "@/lib/actions/field-errors";
import type { DoubtPreview } from "@/lib/rework/doubt-view";
import type { ReworkForm } from "@/lib/rework/load-rework-form";
import { recordReworkInput } from "@/lib/rework/schema";
import type { ReworkActs } from "./rework-acts";
import { doubtInput, freshRework, saysSomething, wireOf, type ReworkDraft } from "./rework-draft";

const PAUSE_MS = 350;

type Props = { project: string; form: ReworkForm; acts: ReworkActs };

/** What is typed, what it would put in doubt as far as that is known, and the way it is recorded. */
export function useReworkEditor({ project, form, acts }: Props) {
  const router = useRouter();
  const [draft, setDraft] = useState(() => freshRework(form));
  const [shown, setShown] = useState<{ key: string; preview: DoubtPreview }>();
  const [lookFailure, setLookFailure] = useState<string>();
  const [error, setError] = useState<Refused>();
  const [isPending, setPending] = useState(false);
  const [look, setLook] = useState(0);
  const writeId = useRef(crypto.randomUUID());
  const key = JSON.stringify(doubtInput(draft));
  const isWorth = saysSomething(draft);
  const { serial } = form.unit;

  useEffect(() => {
    if (!isWorth) return undefined;
    let isGone = false;
    const timer = setTimeout(async () => {
      const asked: ReturnType<typeof doubtInput> = JSON.parse(key);
      const reply = await reach(() => acts.preview({ project, unit: serial, ...asked }));
      if (isGone) return;
      if (reply.ok) setShown({ key, preview: reply.value });
      setLookFailure(reply.ok ? undefined : reply.error.message);
    }, PAUSE_MS);
    return () => {
      isGone = true;
      clearTimeout(timer);
    };
  }, [key, isWorth, look, project, serial, acts]);

  const change = (part: Partial<ReworkDraft>) => setDraft((before) => ({ ...before, ...part }));
  const isFresh = isWorth && shown?.key === key;

  async function record() {
    if (!isFresh) return;
    const { what, why, performedAt, faultId } = draft;
    const input = {
      ...{ project, unit: serial, writeId: writeId.current, what, why, wire: wireOf(draft) },
      ...{ kind: draft.kind, touches: draft.touches, added: draft.added, spared: draft.spared },
      faultId: faultId === "" ? null : faultId,
      carriedFrom: form.start.carried?.id ?? null,
      performedAt: (performedAt === "" ? new Date() : new Date(performedAt)).toISOString(),
      seen: shown.preview.doubtful.map(({ checkId }) => checkId),
    };
    const checked = recordReworkInput.safeParse(input);
    if (!checked.success)
      return setError({
        code: "invalid",
        message: "Something needs another look.",
        fields: fieldErrors(checked.error),
      });
    setPending(true);
    setError(undefined);
    const reply = await reach(() => acts.record(input)).finally(() => setPending(false));
    if (reply.ok) {
      const { number, doubtful } = reply.value;
      toast({
        text: `R${number} is recorded. ${doubtful === 0 ? "Nothing is in doubt." : `${doubtful} ${doubtful === 1 ? "check is" : "checks are"} in doubt.`}`,
      });
      router.push(`/projects/${project}/units/${encodeURIComponent(serial)}/reworks#R${number}`);
      router.refresh();
      return undefined;
    }
    setError(reply.error);
    if (reply.error.code === "conflict") {
      // The same rework under a new id, over the list as it is now.
      writeId.current = crypto.randomUUID();
      setShown(undefined);
      setLook((times) => times + 1);
    }
    return undefined;
  }

  return {
    draft,
    change,
    preview: isWorth ? shown?.preview : undefined,
    isFresh,
    isWorth,
    lookFailure,
    record,
    isPending,
    error,
  };
}
