"use server";

import { defineAction } from "@/lib/actions/define-action";
import { archiveSlot as archive } from "@/lib/slot/archive-slot";
import { createSlot as create } from "@/lib/slot/create-slot";
import { editSlot as edit } from "@/lib/slot/edit-slot";
import { placeUnit as place } from "@/lib/slot/place-unit";
import { removeUnit as remove } from "@/lib/slot/remove-unit";
import { restoreSlot as restore } from "@/lib/slot/restore-slot";
import { changeSlotInput, createSlotInput, editSlotInput, placeUnitInput } from "@/lib/slot/schema";
import { changeUnitInput } from "@/lib/unit/schema";

const permission = "slot.edit";

export const createSlot = defineAction({ name: "create-slot", permission, input: createSlotInput, run: create });

export const editSlot = defineAction({ name: "edit-slot", permission, input: editSlotInput, run: edit });

export const archiveSlot = defineAction({ name: "archive-slot", permission, input: changeSlotInput, run: archive });

export const restoreSlot = defineAction({ name: "restore-slot", permission, input: changeSlotInput, run: restore });

export const placeUnit = defineAction({ name: "place-unit", permission, input: placeUnitInput, run: place });

export const removeUnit = defineAction({ name: "remove-unit", permission, input: changeUnitInput, run: remove });
