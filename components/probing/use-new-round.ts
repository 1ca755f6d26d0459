"use client";

import { useEffect, useRef, useState } from "react";
import type { z } from "zod";
import { reach, type Refused, type Reply } from "@/components/ui/form/reply";
import type { RoundPreview } from "@/lib/probing/preview-round";
import type { previewRoundInput, RoundOptionsTyped } from "@/lib/probing/schema";

export type Preview = (input: z.input<typeof previewRoundInput>) => Promise<Reply<RoundPreview>>;

export const WHOLE_BOARD: RoundOptionsTyped = {
  populated: true,
  limits: "3",
  continuityOhm: "10 Ω",
  isolationOhm: "10 MΩ",
  only: "all",
  connector: "",
  signals: [],
  vias: false,
  unconnected: false,
};

const QUIET_MS = 350;

/** The options as they are being chosen, and what the round would be with them; an answer that came too late is dropped. */
export function useNewRound(project: string, netlistId: string, preview: Preview) {
  const [options, setOptions] = useState(WHOLE_BOARD);
  const [shown, setShown] = useState<RoundPreview>();
  const [refused, setRefused] = useState<Refused>();
  const [isPlanning, setPlanning] = useState(true);
  const latest = useRef(0);

  useEffect(() => {
    const mine = (latest.current += 1);
    const timer = setTimeout(async () => {
      setPlanning(true);
      const reply = await reach(() => preview({ project, netlistId, options }));
      if (mine !== latest.current) return;
      setPlanning(false);
      setShown(reply.ok ? reply.value : undefined);
      setRefused(reply.ok ? undefined : reply.error);
    }, QUIET_MS);
    return () => clearTimeout(timer);
  }, [project, netlistId, options, preview]);

  return {
    ...{ options, shown, refused, isPlanning },
    choose: (change: Partial<RoundOptionsTyped>) => setOptions((before) => ({ ...before, ...change })),
  };
}

export type NewRoundState = ReturnType<typeof useNewRound>;
