"use server";

import { defineAction } from "@/lib/actions/define-action";
import { saveBoardPlan as savePlan } from "@/lib/board-plan/save-board-plan";
import { saveBom as saveList } from "@/lib/board-plan/save-bom";
import { saveBoardPlanInput, saveBomInput, tieSparesInput } from "@/lib/board-plan/schema";
import { tieSpares as tie } from "@/lib/board-plan/tie-spares";

const permission = "parts.edit";

export const saveBoardPlan = defineAction({
  name: "save-board-plan",
  permission,
  input: saveBoardPlanInput,
  run: savePlan,
});

export const saveBom = defineAction({ name: "save-bom", permission, input: saveBomInput, run: saveList });

export const tieSpares = defineAction({ name: "tie-spares", permission, input: tieSparesInput, run: tie });
