"use client";

import { useRouter } from "next/navigation";
import { Select } from "@/components/ui/Select";
import { capturesAddress } from "@/lib/attachment/captures-address";
import type { CapturesQuery } from "@/lib/attachment/load-captures";

type Props = { project: string; query: CapturesQuery; units: readonly string[] };

export function UnitFilter({ project, query, units }: Props) {
  const router = useRouter();
  const options = [{ id: "all", label: "All units" }, ...units.map((serial) => ({ id: serial, label: serial }))];
  return (
    <Select
      label="Unit"
      isLabelHidden
      className="w-full sm:w-44"
      options={options}
      value={query.unit ?? "all"}
      onChange={(id) =>
        router.push(capturesAddress(project, { kind: query.kind, unit: id === "all" ? undefined : id }))
      }
    />
  );
}
