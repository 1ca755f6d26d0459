"use server";

import { defineAction } from "@/lib/actions/define-action";
import { removeSignal as remove } from "@/lib/signal/remove-signal";
import { saveSignal as save } from "@/lib/signal/save-signal";
import { removeSignalInput, saveSignalInput } from "@/lib/signal/schema";

const permission = "wiring.edit";

export const saveSignal = defineAction({ name: "save-signal", permission, input: saveSignalInput, run: save });

export const removeSignal = defineAction({ name: "remove-signal", permission, input: removeSignalInput, run: remove });
