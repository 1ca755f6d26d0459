"use client";

import clsx from "clsx";
import { SearchField } from "@/components/ui/SearchField";
import { Select } from "@/components/ui/Select";
import { SIGNAL_CLASSES } from "@/lib/calc/interconnect";
import { PROBLEMS, type NetFilter } from "./net-lines";

const ANY = "any";
const CLASS_OPTIONS = [
  { id: ANY, label: "Every class" },
  ...SIGNAL_CLASSES.map((id) => ({ id, label: id.charAt(0).toUpperCase() + id.slice(1) })),
];
const PROBLEM_OPTIONS = [
  { id: "any", label: "Every net" },
  { id: "must", label: "Must be mended" },
  { id: "found", label: "With findings" },
  { id: "none", label: "Without findings" },
];

type Props = {
  filter: NetFilter;
  found: number;
  isNarrow: boolean;
  onChange: (change: Partial<NetFilter>) => void;
};

export function NetFilters({ filter, found, isNarrow, onChange }: Props) {
  const half = isNarrow ? "min-w-0 flex-1 basis-32" : "min-w-36 flex-1 sm:max-w-56";
  return (
    <div className="mb-3 flex flex-wrap gap-2.5">
      <SearchField
        label="Find a net, board or slot"
        value={filter.search}
        onChange={(search) => onChange({ search })}
        className={clsx("min-w-0 flex-1 basis-full", !isNarrow && "sm:max-w-80 sm:basis-56")}
      />
      <Select
        label="Class"
        isLabelHidden
        className={half}
        options={CLASS_OPTIONS}
        value={filter.class ?? ANY}
        onChange={(id) => onChange({ class: SIGNAL_CLASSES.find((one) => one === id) ?? null })}
      />
      <Select
        label="Findings"
        isLabelHidden
        className={half}
        options={PROBLEM_OPTIONS}
        value={filter.problem}
        onChange={(id) => onChange({ problem: PROBLEMS.find((one) => one === id) ?? "any" })}
      />
      <p role="status" className="sr-only">
        {found} found
      </p>
    </div>
  );
}
