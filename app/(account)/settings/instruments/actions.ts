"use server";

import { defineAction } from "@/lib/actions/define-action";
import { archiveInstrument as archiveIt, restoreInstrument as restoreIt } from "@/lib/instrument/archive-instrument";
import { saveInstrument as saveIt } from "@/lib/instrument/save-instrument";
import { changeInstrumentInput, saveInstrumentInput } from "@/lib/instrument/schema";

export const saveInstrument = defineAction({
  name: "save-instrument",
  permission: "own",
  input: saveInstrumentInput,
  run: saveIt,
});

export const archiveInstrument = defineAction({
  name: "archive-instrument",
  permission: "own",
  input: changeInstrumentInput,
  run: archiveIt,
});

export const restoreInstrument = defineAction({
  name: "restore-instrument",
  permission: "own",
  input: changeInstrumentInput,
  run: restoreIt,
});
