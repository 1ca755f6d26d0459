"use server";

import { defineAction } from "@/lib/actions/define-action";
import { archivePart as archive, restorePart as restore } from "@/lib/part/archive-part";
import { savePart as save } from "@/lib/part/save-part";
import { changePartInput, savePartInput, stockPartInput } from "@/lib/part/schema";
import { stockPart as stock } from "@/lib/part/stock-part";
import { saveSpares as spares } from "@/lib/parts-list/save-spares";
import { saveSparesInput } from "@/lib/parts-list/schema";

const permission = "parts.edit";

export const savePart = defineAction({ name: "save-part", permission, input: savePartInput, run: save });

export const stockPart = defineAction({ name: "stock-part", permission, input: stockPartInput, run: stock });

export const archivePart = defineAction({ name: "archive-part", permission, input: changePartInput, run: archive });

export const restorePart = defineAction({ name: "restore-part", permission, input: changePartInput, run: restore });

export const saveSpares = defineAction({ name: "save-spares", permission, input: saveSparesInput, run: spares });
