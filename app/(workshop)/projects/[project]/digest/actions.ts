"use server";

import { defineAction } from "@/lib/actions/define-action";
import { sendPreview, sendPreviewInput } from "@/lib/digest/send-preview";

export const sendToMe = defineAction({
  name: "send-digest-preview",
  permission: "digest.preview",
  input: sendPreviewInput,
  run: sendPreview,
});
