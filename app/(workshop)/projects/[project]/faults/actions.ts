"use server";

import { defineAction } from "@/lib/actions/define-action";
import { editFault as edit } from "@/lib/fault/edit-fault";
import { findSimilar } from "@/lib/fault/find-similar";
import { openFault as open } from "@/lib/fault/open-fault";
import { editFaultInput, openFaultInput, similarInput } from "@/lib/fault/schema";

export const openFault = defineAction({
  name: "open-fault",
  permission: "fault.write",
  input: openFaultInput,
  run: open,
});

export const editFault = defineAction({
  name: "edit-fault",
  permission: "fault.write",
  input: editFaultInput,
  run: edit,
});

export const similarFaults = defineAction({
  name: "similar-faults",
  permission: "project.see",
  input: similarInput,
  run: findSimilar,
});
