"use server";

import { defineAction } from "@/lib/actions/define-action";
import { previewRework as preview } from "@/lib/rework/preview-rework";
import { recordRework as record } from "@/lib/rework/record-rework";
import { previewReworkInput, recordReworkInput } from "@/lib/rework/schema";

export const previewRework = defineAction({
  name: "preview-rework",
  permission: "rework.record",
  input: previewReworkInput,
  run: preview,
});

export const recordRework = defineAction({
  name: "record-rework",
  permission: "rework.record",
  input: recordReworkInput,
  run: record,
});
