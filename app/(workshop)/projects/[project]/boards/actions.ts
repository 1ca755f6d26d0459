"use server";

import { defineAction } from "@/lib/actions/define-action";
import { archiveBoard as archive } from "@/lib/board/archive-board";
import { createBoard as create } from "@/lib/board/create-board";
import { createRevision as begin } from "@/lib/board/create-revision";
import { editBoard as edit } from "@/lib/board/edit-board";
import { purgeBoard as purge } from "@/lib/board/purge-board";
import { releaseRevision as release } from "@/lib/board/release-revision";
import { restoreBoard as restore } from "@/lib/board/restore-board";
import {
  changeBoardInput,
  createBoardInput,
  createRevisionInput,
  editBoardInput,
  purgeBoardInput,
  releaseRevisionInput,
} from "@/lib/board/schema";

const permission = "board.edit";

export const createBoard = defineAction({ name: "create-board", permission, input: createBoardInput, run: create });

export const editBoard = defineAction({ name: "edit-board", permission, input: editBoardInput, run: edit });

export const archiveBoard = defineAction({ name: "archive-board", permission, input: changeBoardInput, run: archive });

export const restoreBoard = defineAction({ name: "restore-board", permission, input: changeBoardInput, run: restore });

export const purgeBoard = defineAction({
  name: "purge-board",
  permission: "board.purge",
  input: purgeBoardInput,
  run: purge,
});

export const createRevision = defineAction({
  name: "create-revision",
  permission,
  input: createRevisionInput,
  run: begin,
});

export const releaseRevision = defineAction({
  name: "release-revision",
  permission,
  input: releaseRevisionInput,
  run: release,
});
