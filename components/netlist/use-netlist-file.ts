"use client";

import { useMemo, useState } from "react";
import { guessPinColumns, columnsOf, type ListMapping } from "@/lib/netlist/guess-pin-columns";
import { guessSource } from "@/lib/netlist/guess-source";
import { readFile, type FileRead } from "@/lib/netlist/read-file";
import { NETLIST_LIMITS, type NetlistFile } from "@/lib/netlist/schema";
import type { IpcScale, PinListUnit } from "@/lib/calc/netlist";
import { decodeFile } from "@/lib/pin-map-file/decode-file";
import { splitTable, type Delimiter, type Table } from "@/lib/pin-map-file/split-table";

type Source = NetlistFile["source"];
export type Corrections = {
  source?: Source;
  scale?: IpcScale | null;
  delimiter?: Delimiter | undefined;
  hasHeadings?: boolean | undefined;
  mapping?: ListMapping | undefined;
  unit?: PinListUnit;
};

type Loaded = { name: string; text: string; encoding: string };
/** As it was read: what goes to the server, and how the rows of a table were understood. */
export type NetlistRead = {
  file: NetlistFile | undefined;
  table: { table: Table; hasHeadings: boolean; mapping: ListMapping; unit: PinListUnit } | undefined;
  source: Source;
  scale: IpcScale | null;
  result: FileRead;
};

/** What a person chose of a file; everything else follows from it, in the browser, until it is confirmed. */
export function useNetlistFile() {
  const [loaded, setLoaded] = useState<Loaded>();
  const [refused, setRefused] = useState<string>();
  const [corrected, setCorrected] = useState<Corrections>({});

  async function open(files: readonly File[]) {
    const [given] = files;
    if (!given) return;
    const decoded = decodeFile(new Uint8Array(await given.arrayBuffer()), NETLIST_LIMITS.bytes);
    setCorrected({});
    setLoaded(decoded.ok ? { name: given.name, text: decoded.text, encoding: decoded.encoding } : undefined);
    setRefused(decoded.ok ? undefined : `${given.name}: ${decoded.sentence}`);
  }

  const read = useMemo(() => (loaded ? readLoaded(loaded, corrected) : undefined), [loaded, corrected]);
  return {
    ...{ loaded, open, refused, read },
    correct: (change: Corrections) => setCorrected({ ...corrected, ...change }),
    forget() {
      setLoaded(undefined);
      setRefused(undefined);
      setCorrected({});
    },
  };
}

function readLoaded({ name, text }: Loaded, corrected: Corrections): NetlistRead {
  const source = corrected.source ?? guessSource(text);
  const scale = corrected.scale ?? null;
  const base = { source, scale, table: undefined, file: undefined };
  if (source === "ipc-d-356") {
    const file: NetlistFile = { source, fileName: name, text, scale };
    return { ...base, file, result: readFile(file) };
  }
  const split = splitTable(text, corrected.delimiter, NETLIST_LIMITS.rows);
  if (!split.ok) return { ...base, result: split };
  const { table } = split;
  const guess = guessPinColumns(table);
  const { hasHeadings = guess.hasHeadings, mapping = guess.mapping, unit = "mm" } = corrected;
  const columns = columnsOf(mapping);
  const understood = { table, hasHeadings, mapping, unit };
  if (!columns) {
    return {
      ...base,
      table: understood,
      result: { ok: false, sentence: "Say which columns hold the net and the pin." },
    };
  }
  const file: NetlistFile = {
    ...{ source, fileName: name, text, hasHeadings, columns, unit },
    delimiter: table.delimiter,
  };
  return { ...base, table: understood, file, result: readFile(file) };
}
