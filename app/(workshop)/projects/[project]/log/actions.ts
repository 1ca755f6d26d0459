"use server";

import { defineAction } from "@/lib/actions/define-action";
import { archiveLogEntry } from "@/lib/log-entry/archive-log-entry";
import { editLogEntry } from "@/lib/log-entry/edit-log-entry";
import { restoreLogEntry } from "@/lib/log-entry/restore-log-entry";
import { editEntryInput, entryInput, writeEntryInput } from "@/lib/log-entry/schema";
import { writeLogEntry } from "@/lib/log-entry/write-log-entry";

export const writeEntry = defineAction({
  name: "write-log-entry",
  permission: "log.write",
  input: writeEntryInput,
  run: writeLogEntry,
});

export const editEntry = defineAction({
  name: "edit-log-entry",
  permission: "log.write",
  input: editEntryInput,
  run: editLogEntry,
});

export const archiveEntry = defineAction({
  name: "archive-log-entry",
  permission: "log.write",
  input: entryInput,
  run: archiveLogEntry,
});

export const restoreEntry = defineAction({
  name: "restore-log-entry",
  permission: "log.write",
  input: entryInput,
  run: restoreLogEntry,
});
