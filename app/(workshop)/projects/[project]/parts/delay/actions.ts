"use server";

import { defineAction } from "@/lib/actions/define-action";
import { archiveDelayPath as archive, restoreDelayPath as restore } from "@/lib/delay-path/archive-delay-path";
import { saveDelayPath as save } from "@/lib/delay-path/save-delay-path";
import { changeDelayPathInput, saveDelayPathInput } from "@/lib/delay-path/schema";

const permission = "parts.edit";

export const saveDelayPath = defineAction({
  name: "save-delay-path",
  permission,
  input: saveDelayPathInput,
  run: save,
});

export const archiveDelayPath = defineAction({
  name: "archive-delay-path",
  permission,
  input: changeDelayPathInput,
  run: archive,
});

export const restoreDelayPath = defineAction({
  name: "restore-delay-path",
  permission,
  input: changeDelayPathInput,
  run: restore,
});
