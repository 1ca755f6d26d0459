"use client";

import { useMemo, useState } from "react";
import { pinNamed } from "@/lib/calc/connector";
import { decodeFile } from "@/lib/pin-map-file/decode-file";
import type { TakeTarget } from "@/lib/pin-map-file/resolve-target";
import { guessColumns, type Mapping } from "@/lib/pin-map-file/guess-columns";
import { judgeRows } from "@/lib/pin-map-file/judge-rows";
import { planTake, type Unnamed } from "@/lib/pin-map-file/plan-take";
import { splitTable, type Delimiter } from "@/lib/pin-map-file/split-table";
import type { KnownNames } from "@/lib/pin-map/read-cell";

type Loaded = { name: string; text: string; encoding: string };
type Corrections = { delimiter?: Delimiter; hasHeadings?: boolean; mapping?: Mapping };

/** What a person chose of a file; everything else follows from it, in the browser, until it is confirmed. */
export function useTakeState(targets: readonly TakeTarget[], known: KnownNames, first: string | null) {
  const [chosenId, setChosen] = useState(first);
  const [file, setFile] = useState<Loaded>();
  const [refused, setRefused] = useState<string>();
  const [corrected, setCorrected] = useState<Corrections>({});
  const [unnamed, setUnnamed] = useState<Unnamed>("keep");

  async function open(files: readonly File[]) {
    const [given] = files;
    if (!given) return;
    const decoded = decodeFile(new Uint8Array(await given.arrayBuffer()));
    setCorrected({});
    setFile(decoded.ok ? { name: given.name, text: decoded.text, encoding: decoded.encoding } : undefined);
    setRefused(decoded.ok ? undefined : `${given.name}: ${decoded.sentence}`);
  }

  const split = useMemo(
    () => (file ? splitTable(file.text, corrected.delimiter) : undefined),
    [file, corrected.delimiter],
  );
  const table = split?.ok ? split.table : undefined;
  const read = useMemo(() => {
    if (!table) return undefined;
    const isPin = (cell: string) => targets.some(({ face }) => pinNamed(face, cell) !== undefined);
    const guess = guessColumns(table, isPin);
    const { hasHeadings = guess.hasHeadings, mapping = guess.mapping } = corrected;
    const judged = judgeRows({ table, hasHeadings, mapping, targets, chosenId, known });
    return { table, hasHeadings, mapping, judged, plan: planTake(judged.pins, unnamed) };
  }, [table, corrected, targets, chosenId, known, unnamed]);

  return {
    ...{ chosenId, setChosen, file, open, unnamed, setUnnamed, read },
    refused: refused ?? (split && !split.ok ? `${file?.name ?? "The file"}: ${split.sentence}` : undefined),
    correct: (change: Corrections) => setCorrected({ ...corrected, ...change }),
    forget() {
      setFile(undefined);
      setRefused(undefined);
      setCorrected({});
    },
  };
}

export type TakeState = ReturnType<typeof useTakeState>;
export type TakeRead = NonNullable<TakeState["read"]>;
