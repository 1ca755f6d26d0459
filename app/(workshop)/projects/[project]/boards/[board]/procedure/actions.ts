"use server";

import { defineAction } from "@/lib/actions/define-action";
import { offerToCheck as offer } from "@/lib/offer/offer-to-check";
import { offerToCheckInput } from "@/lib/offer/schema";
import { deleteCheck as remove } from "@/lib/procedure/delete-check";
import { discardDraft as discard } from "@/lib/procedure/discard-draft";
import { issueProcedure as issue } from "@/lib/procedure/issue-procedure";
import { reorderChecks as reorder } from "@/lib/procedure/reorder-checks";
import { saveCheck as save } from "@/lib/procedure/save-check";
import {
  deleteCheckInput,
  discardDraftInput,
  issueProcedureInput,
  reorderChecksInput,
  saveCheckInput,
  startDraftInput,
} from "@/lib/procedure/schema";
import { startDraft as start } from "@/lib/procedure/start-draft";

const permission = "procedure.edit";

export const startDraft = defineAction({ name: "start-draft", permission, input: startDraftInput, run: start });

export const saveCheck = defineAction({ name: "save-check", permission, input: saveCheckInput, run: save });

export const deleteCheck = defineAction({ name: "delete-check", permission, input: deleteCheckInput, run: remove });

export const reorderChecks = defineAction({
  name: "reorder-checks",
  permission,
  input: reorderChecksInput,
  run: reorder,
});

export const discardDraft = defineAction({ name: "discard-draft", permission, input: discardDraftInput, run: discard });

export const issueProcedure = defineAction({
  name: "issue-procedure",
  permission,
  input: issueProcedureInput,
  run: issue,
});

export const offerToCheck = defineAction({ name: "offer-to-check", permission, input: offerToCheckInput, run: offer });
