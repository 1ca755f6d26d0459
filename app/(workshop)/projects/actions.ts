"use server";

import { defineAction } from "@/lib/actions/define-action";
import { archiveProject as archive } from "@/lib/project/archive-project";
import { createProject as create } from "@/lib/project/create-project";
import { editProject as edit } from "@/lib/project/edit-project";
import { purgeProject as purge } from "@/lib/project/purge-project";
import { restoreProject as restore } from "@/lib/project/restore-project";
import { changeProjectInput, createProjectInput, editProjectInput, purgeProjectInput } from "@/lib/project/schema";

export const createProject = defineAction({
  name: "create-project",
  permission: "own",
  input: createProjectInput,
  run: create,
});

export const editProject = defineAction({
  name: "edit-project",
  permission: "project.edit",
  input: editProjectInput,
  run: edit,
});

export const archiveProject = defineAction({
  name: "archive-project",
  permission: "project.archive",
  input: changeProjectInput,
  run: archive,
});

export const restoreProject = defineAction({
  name: "restore-project",
  permission: "project.archive",
  input: changeProjectInput,
  run: restore,
});

export const purgeProject = defineAction({
  name: "purge-project",
  permission: "project.archive",
  input: purgeProjectInput,
  run: purge,
});
