"use server";

import { defineAction } from "@/lib/actions/define-action";
import { captionAttachment } from "@/lib/attachment/caption-attachment";
import { removeAttachment } from "@/lib/attachment/remove-attachment";
import { restoreAttachment } from "@/lib/attachment/restore-attachment";
import { attachmentInput, captionInput } from "@/lib/attachment/schema";

export const captionEvidence = defineAction({
  name: "caption-attachment",
  permission: "evidence.attach",
  input: captionInput,
  run: captionAttachment,
});

export const removeEvidence = defineAction({
  name: "remove-attachment",
  permission: "evidence.attach",
  input: attachmentInput,
  run: removeAttachment,
});

export const restoreEvidence = defineAction({
  name: "restore-attachment",
  permission: "evidence.attach",
  input: attachmentInput,
  run: restoreAttachment,
});
