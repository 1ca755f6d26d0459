import { useCallback, useMemo, useRef, useState } from "react";
import type { Judged, JudgeContext } from "@/lib/check-kinds/kind";
import type { BenchProps } from "./bench-props";
import { keepDraft } from "./draft-store";
import { foresee } from "./foresee";
import { nextFree } from "./next-check";
import { clearFiles } from "./queue/file-shelf";
import type { NewAttempt } from "./queue/held-attempt";
import { restore, type Bench } from "./use-bench";
import { useDraft } from "./use-draft";
import { useHeldFiles } from "./use-held-files";
import { useInstrument } from "./use-instrument";
import { useSlip } from "./use-slip";

const NO_UNITS: readonly string[] = [];
const NOT_LAID_DOWN =
  "The device would not keep it (its storage is full or forbidden). Nothing was recorded; what you typed is still here.";

/** What is entered for the open check, its verdict as one types, and recording it. */
export function useRecord(props: BenchProps, bench: Bench) {
  const { viewer, project, traveler } = props;
  const { current, kind } = bench;
  const checkId = current?.id ?? "";
  const [draft, setDraft] = useDraft(viewer.id, checkId);
  const files = useHeldFiles(viewer.id, checkId);
  const units = useMemo(() => (current && kind ? kind.units(current.spec) : NO_UNITS), [current, kind]);
  const instrument = useInstrument(viewer.id, props.instruments, units);
  const [trouble, setTrouble] = useState<{ checkId: string; sentence: string; field: string | undefined }>();
  const busy = useRef(false);
  const slip = useSlip(props, bench);

  const note = draft?.note ?? "";
  const entry =
    draft && kind?.isEntry(draft.entry) ? draft.entry : current && kind ? kind.emptyEntry(current.spec) : undefined;
  const usable = files.filter((file) => file.refusal === "");
  const context: JudgeContext = {
    rule: project.rule,
    instrumentRanges: instrument.instrument?.ranges ?? [],
    evidence: usable.map((file) => file.kind),
    note,
  };
  const judge = (value: unknown): Judged | undefined =>
    current && kind ? kind.judge(current.spec, value, context) : undefined;
  const judged = kind && !kind.isBlank(entry) ? judge(entry) : undefined;

  const setEntry = useCallback((next: unknown) => setDraft({ entry: next, note }), [setDraft, note]);
  const setNote = useCallback((next: string) => setDraft({ entry, note: next }), [setDraft, entry]);

  /** Lays the attempt down on the device and moves on. Answers what is missing, or undefined when it is recorded. */
  async function record(value: unknown = entry): Promise<string | undefined> {
    if (!current || !kind || busy.current) return undefined;
    const verdict = judge(value);
    if (!verdict?.ok) {
      setDraft({ entry: value, note });
      setTrouble({
        checkId,
        sentence: verdict?.message ?? "Enter the reading.",
        field: Object.keys(verdict?.fields ?? {})[0],
      });
      return verdict?.fields?.note ? "note" : "entry";
    }
    busy.current = true;
    const attempt: NewAttempt = {
      userId: viewer.id,
      project: project.slug,
      serial: traveler.unit.serial,
      checkTitle: current.title,
      foreseen: verdict.verdict,
      summary: kind.summary(current.spec, value, verdict.readings),
      files: [...usable],
      body: {
        id: crypto.randomUUID(),
        checkId,
        performedAt: new Date().toISOString(),
        record: value,
        note,
        instrumentId: instrument.instrument?.id ?? null,
        attachmentIds: usable.flatMap((file) => file.attachmentId ?? []),
        seenArrival: Math.max(0, ...current.attempts.map((one) => one.arrival)),
      },
    };
    try {
      for (const refused of bench.refused) await bench.queue().withdraw(refused.body.id);
      await bench.queue().add(attempt);
    } catch {
      setTrouble({ checkId, sentence: NOT_LAID_DOWN, field: undefined });
      return "entry";
    } finally {
      busy.current = false;
    }
    keepDraft(viewer.id, checkId, undefined);
    setTrouble(undefined);
    await clearFiles(
      checkId,
      files.map((file) => file.uploadId),
    ).catch(() => undefined);
    slip.offer(attempt);
    // With this one done: a hold point that is passed frees what waited for it, network or not.
    const next = nextFree(foresee(bench.checks, [{ checkId, verdict: verdict.verdict }]), checkId);
    if (next) bench.open(next.id);
    return undefined;
  }

  return {
    entry,
    setEntry,
    note,
    setNote,
    files,
    instrument,
    units,
    judged,
    record,
    restore,
    slip,
    trouble: trouble?.checkId === checkId ? trouble : undefined,
  };
}

export type Recording = ReturnType<typeof useRecord>;
