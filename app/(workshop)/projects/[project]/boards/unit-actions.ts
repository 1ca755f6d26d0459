"use server";

import { defineAction } from "@/lib/actions/define-action";
import { archiveUnit as archive } from "@/lib/unit/archive-unit";
import { createUnit as create } from "@/lib/unit/create-unit";
import { editUnit as edit } from "@/lib/unit/edit-unit";
import { purgeUnit as purge } from "@/lib/unit/purge-unit";
import { restoreUnit as restore } from "@/lib/unit/restore-unit";
import { changeUnitInput, createUnitInput, editUnitInput, purgeUnitInput } from "@/lib/unit/schema";

const permission = "unit.edit";

export const createUnit = defineAction({ name: "create-unit", permission, input: createUnitInput, run: create });

export const editUnit = defineAction({ name: "edit-unit", permission, input: editUnitInput, run: edit });

export const archiveUnit = defineAction({ name: "archive-unit", permission, input: changeUnitInput, run: archive });

export const restoreUnit = defineAction({ name: "restore-unit", permission, input: changeUnitInput, run: restore });

export const purgeUnit = defineAction({
  name: "purge-unit",
  permission: "board.purge",
  input: purgeUnitInput,
  run: purge,
});
