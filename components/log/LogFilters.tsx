"use client";

import { useRouter } from "next/navigation";
import { Select } from "@/components/ui/Select";
import type { LogQuery, LogView } from "@/lib/log-entry/load-log";
import { logAddress } from "@/lib/log-entry/log-address";

type Props = { project: string; query: LogQuery } & Pick<LogView, "units" | "people">;

const ALL = "all";

/** By unit and by person; each choice is an address, so that it can be kept and sent. */
export function LogFilters({ project, query, units, people }: Props) {
  const router = useRouter();
  const go = (change: Partial<LogQuery>) =>
    router.push(logAddress(project, { ...query, before: undefined, ...change }));
  const chosen = (id: string) => (id === ALL ? undefined : id);
  return (
    <div className="flex flex-wrap gap-3">
      <Select
        label="Unit"
        isLabelHidden
        className="min-w-36 flex-1 sm:max-w-48"
        options={[{ id: ALL, label: "Every unit" }, ...units.map((serial) => ({ id: serial, label: serial }))]}
        value={query.unit ?? ALL}
        onChange={(id) => go({ unit: chosen(id) })}
      />
      <Select
        label="Person"
        isLabelHidden
        className="min-w-36 flex-1 sm:max-w-56"
        options={[
          { id: ALL, label: "Everybody" },
          ...people.flatMap(({ id, name }) => (id === null ? [] : [{ id, label: name }])),
        ]}
        value={query.by ?? ALL}
        onChange={(id) => go({ by: chosen(id) })}
      />
    </div>
  );
}
