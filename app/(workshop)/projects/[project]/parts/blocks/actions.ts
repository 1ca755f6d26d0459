"use server";

import { defineAction } from "@/lib/actions/define-action";
import { archiveBlock as archive, restoreBlock as restore } from "@/lib/block/archive-block";
import { saveBlock as save } from "@/lib/block/save-block";
import { changeBlockInput, saveBlockInput } from "@/lib/block/schema";

const permission = "parts.edit";

export const saveBlock = defineAction({ name: "save-block", permission, input: saveBlockInput, run: save });

export const archiveBlock = defineAction({ name: "archive-block", permission, input: changeBlockInput, run: archive });

export const restoreBlock = defineAction({ name: "restore-block", permission, input: changeBlockInput, run: restore });
