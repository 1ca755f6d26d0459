"use client";

import { useRouter } from "next/navigation";
import { useState } from "react";
import { SearchField } from "@/components/ui/SearchField";
import { Select } from "@/components/ui/Select";
import type { FaultQuery, FaultsView } from "@/lib/fault/load-faults";
import { faultsAddress } from "./fault-address";

type Props = { project: string; query: FaultQuery } & Pick<FaultsView, "boards" | "units">;

const ALL = "all";

/** By words, board and unit; each choice is an address, so that it can be kept and sent. */
export function FaultFilters({ project, query, boards, units }: Props) {
  const router = useRouter();
  const [text, setText] = useState(query.q);
  const go = (change: Partial<FaultQuery>) => router.push(faultsAddress(project, { ...query, q: text, ...change }));
  const chosen = (id: string) => (id === ALL ? undefined : id);
  return (
    <div className="flex flex-wrap gap-3">
      <SearchField
        label="Words, a signal, F3"
        value={text}
        onChange={(q) => {
          setText(q);
          if (q === "" && query.q !== "") go({ q });
        }}
        onSubmit={(q) => go({ q })}
        className="min-w-0 flex-1 basis-56 sm:max-w-80"
      />
      <Select
        label="Board"
        isLabelHidden
        className="min-w-36 flex-1 sm:max-w-56"
        options={[
          { id: ALL, label: "Every board" },
          ...boards.map(({ code, name }) => ({ id: code, label: `${code} ${name}` })),
        ]}
        value={query.board ?? ALL}
        onChange={(id) => go({ board: chosen(id), unit: undefined })}
      />
      <Select
        label="Unit"
        isLabelHidden
        className="min-w-32 flex-1 sm:max-w-44"
        options={[{ id: ALL, label: "Every unit" }, ...units.map((serial) => ({ id: serial, label: serial }))]}
        value={query.unit ?? ALL}
        onChange={(id) => go({ unit: chosen(id) })}
      />
    </div>
  );
}
