import { randomUUID } from "node:crypto";
import type { ProjectScope } from "@/lib/access/scope";
import { previewRework } from "@/lib/rework/preview-rework";
import { recordRework } from "@/lib/rework/record-rework";
import { previewReworkInput, recordReworkInput } from "@/lib/rework/schema";
import { must } from "./bench";

type Given = {
  kind?: string;
  what?: string;
  why?: string;
  wire?: { number: string; from: string; to: string; colour: string; out: boolean } | null;
  signals?: string[];
  pins?: string[];
  parts?: string[];
  blocks?: string[];
  rails?: string[];
  added?: { checkId: string; reason: string }[];
  spared?: { checkId: string; reason: string }[];
  faultId?: string | null;
  carriedFrom?: string | null;
  seen?: string[];
  writeId?: string;
  performedAt?: string;
};

function doubtForm(scope: ProjectScope, unit: { serial: string }, given: Given) {
  const { signals = [], pins = [], parts = [], blocks = [], rails = [] } = given;
  return {
    project: scope.slug,
    unit: unit.serial,
    kind: given.kind ?? "cut-track",
    wire: given.wire ?? null,
    touches: { signals, pins, parts, blocks, rails },
    added: given.added ?? [],
    spared: given.spared ?? [],
  };
}

/** What the form shows before it is saved. */
export const preview = (scope: ProjectScope, unit: { serial: string }, given: Given) =>
  must(previewRework(scope, previewReworkInput.parse(doubtForm(scope, unit, given))));

/** Records a rework as the form does: the list was looked at just before. */
export async function rework(scope: ProjectScope, unit: { serial: string }, given: Given) {
  const seen = given.seen ?? (await preview(scope, unit, given)).doubtful.map(({ checkId }) => checkId);
  const { what = "Track cut at U6", why = "", faultId = null, carriedFrom = null } = given;
  const { writeId = randomUUID(), performedAt = new Date().toISOString() } = given;
  const form = { ...doubtForm(scope, unit, given), what, why, faultId, carriedFrom, writeId, performedAt, seen };
  return recordRework(scope, recordReworkInput.parse(form));
}
