"use server";

import { defineAction } from "@/lib/actions/define-action";
import { removeFamily as remove } from "@/lib/family/remove-family";
import { saveFamily as save } from "@/lib/family/save-family";
import { removeFamilyInput, saveFamilyInput } from "@/lib/family/schema";

const permission = "wiring.edit";

export const saveFamily = defineAction({ name: "save-family", permission, input: saveFamilyInput, run: save });

export const removeFamily = defineAction({ name: "remove-family", permission, input: removeFamilyInput, run: remove });
