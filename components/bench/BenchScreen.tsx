"use client";

import { useEffect, useMemo, useRef, useState } from "react";
import type { BenchProps } from "./bench-props";
import { BenchSheets, type OpenSheet } from "./BenchSheets";
import { BenchTop } from "./BenchTop";
import { CheckColumn } from "./CheckColumn";
import { FileInputs } from "./FileInputs";
import { keepOffline } from "./keep-offline";
import { NothingHere } from "./NothingHere";
import { RecordSection } from "./RecordSection";
import { acceptFor, kindsWanted, takeFiles } from "./take-files";
import { UndoBar } from "./UndoBar";
import { useBench } from "./use-bench";
import { useBenchKeys } from "./use-bench-keys";
import { useReadAloud } from "./use-read-aloud";
import { useRecord } from "./use-record";

/** One check a screen: what to do above, what one touches below. Works without network once it has been opened. */
export function BenchScreen(props: BenchProps) {
  const { project, viewer, may } = props;
  const bench = useBench(props);
  const recording = useRecord(props, bench);
  const [sheet, setSheet] = useState<OpenSheet>();
  const [padFor, setPadFor] = useState<string>();
  const camera = useRef<HTMLInputElement>(null);
  const chooser = useRef<HTMLInputElement>(null);
  const { current, kind, traveler } = bench;
  const currentId = current?.id;
  // Shut again on the next check: first one reads what to do there.
  const pad = useMemo(() => ({ isOpen: padFor === currentId, open: () => setPadFor(currentId) }), [padFor, currentId]);
  const read = useReadAloud(
    current
      ? [current.title, current.caution, current.instruction, current.expectation].filter(Boolean).join(". ")
      : "",
  );
  const kinds = useMemo(
    () => kindsWanted(current && kind ? kind.requires(current.spec)?.kinds : undefined),
    [current, kind],
  );

  useEffect(() => {
    // Where workers are forbidden the bench works with network only.
    void keepOffline().catch(() => undefined);
  }, []);

  const record = async (entry?: unknown) => {
    if (!may.record || !current || current.blockers.length > 0) return;
    const missing = await recording.record(entry);
    setSheet(missing === "note" ? "verdict-note" : undefined);
    if (!missing) document.getElementById("check-title")?.focus({ preventScroll: true });
  };

  useBenchKeys((key) => {
    const stated = kind?.stated;
    if (key === "conforms" && stated) void record(stated(true));
    else if (key === "does-not-conform" && stated) void record(stated(false));
    else if (key === "record" && kind?.measured) void record();
    else if (key === "note" && may.record) setSheet("note");
    else if (key === "photo" && may.attach) (kinds[0] === "photo" ? camera : chooser).current?.click();
    else if (key === "previous") bench.step(-1);
    else if (key === "next") bench.step(1);
    else if (key === "keys") setSheet((before) => (before === "keys" ? undefined : "keys"));
  });

  const unitHref = `/projects/${project.slug}/units/${encodeURIComponent(traveler.unit.serial)}`;
  const takes = (files: File[]) => {
    if (current)
      void takeFiles({ project: project.slug, userId: viewer.id, checkId: current.id, kinds, files }).catch(() =>
        setSheet("no-room"),
      );
  };

  return (
    <div className="bg-sheet flex h-dvh flex-col">
      <BenchTop
        unitHref={current ? `${unitHref}?check=${current.id}` : unitHref}
        serial={traveler.unit.serial}
        checks={bench.checks}
        index={bench.index}
        queue={bench.queueState}
        onOverview={() => setSheet("overview")}
        onHeld={() => setSheet("held")}
      />
      {!current || !kind ? (
        <NothingHere known={Boolean(current)} unitHref={unitHref} />
      ) : (
        <div className="mx-auto flex min-h-0 w-full max-w-5xl flex-1 flex-col lg:grid lg:grid-cols-[1fr_26rem]">
          <CheckColumn
            bench={bench}
            recording={recording}
            current={current}
            kind={kind}
            unitHref={unitHref}
            zone={viewer.timeZone}
            reading={read}
            onSheet={setSheet}
            onFile={may.attach ? () => chooser.current?.click() : undefined}
          />
          <RecordSection
            {...{ props, recording, current, kind, pad }}
            onPad={() => (pad.isOpen ? setPadFor(undefined) : pad.open())}
            onRecord={(entry) => void record(entry)}
            onPhoto={() => camera.current?.click()}
            onFile={() => chooser.current?.click()}
            onNote={() => setSheet("note")}
          />
        </div>
      )}
      {recording.slip.slip && (
        <UndoBar
          slip={recording.slip.slip}
          onUndo={() => void recording.slip.undo()}
          onDismiss={recording.slip.dismiss}
        />
      )}
      <FileInputs camera={camera} chooser={chooser} accept={acceptFor(kinds)} onFiles={takes} />
      <BenchSheets
        sheet={sheet}
        onSheet={setSheet}
        bench={bench}
        recording={recording}
        onRecord={(entry) => void record(entry)}
      />
    </div>
  );
}
