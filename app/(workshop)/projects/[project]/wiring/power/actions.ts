"use server";

import { defineAction } from "@/lib/actions/define-action";
import { saveConditions as conditions } from "@/lib/plan-conditions/save-conditions";
import { saveConditionsInput } from "@/lib/plan-conditions/schema";
import { removePowerLine as takeLine } from "@/lib/power/remove-power-line";
import { savePowerLine as saveLine } from "@/lib/power/save-power-line";
import { removePowerLineInput, savePowerLineInput } from "@/lib/power/schema";
import { removeRail as takeRail } from "@/lib/rail/remove-rail";
import { saveRail as rail } from "@/lib/rail/save-rail";
import { removeRailInput, saveRailInput } from "@/lib/rail/schema";

const permission = "wiring.edit";

export const saveConditions = defineAction({
  name: "save-conditions",
  permission,
  input: saveConditionsInput,
  run: conditions,
});

export const saveRail = defineAction({ name: "save-rail", permission, input: saveRailInput, run: rail });

export const removeRail = defineAction({ name: "remove-rail", permission, input: removeRailInput, run: takeRail });

export const savePowerLine = defineAction({
  name: "save-power-line",
  permission,
  input: savePowerLineInput,
  run: saveLine,
});

export const removePowerLine = defineAction({
  name: "remove-power-line",
  permission,
  input: removePowerLineInput,
  run: takeLine,
});
