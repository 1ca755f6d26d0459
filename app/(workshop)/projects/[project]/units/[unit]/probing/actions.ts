"use server";

import { defineAction } from "@/lib/actions/define-action";
import { askAgain as ask } from "@/lib/probing/ask-again";
import { closeRound as close } from "@/lib/probing/close-round";
import { previewRound as preview } from "@/lib/probing/preview-round";
import { askAgainInput, closeRoundInput, previewRoundInput, startRoundInput } from "@/lib/probing/schema";
import { startRound as start } from "@/lib/probing/start-round";

/** Changes nothing, but works hard: only for those who may start one. */
export const previewRound = defineAction({
  name: "preview-round",
  permission: "attempt.record",
  input: previewRoundInput,
  run: preview,
});

export const startRound = defineAction({
  name: "start-round",
  permission: "attempt.record",
  input: startRoundInput,
  run: start,
});

export const closeRound = defineAction({
  name: "close-round",
  permission: "attempt.record",
  input: closeRoundInput,
  run: close,
});

export const askAgain = defineAction({
  name: "ask-again",
  permission: "attempt.record",
  input: askAgainInput,
  run: ask,
});
