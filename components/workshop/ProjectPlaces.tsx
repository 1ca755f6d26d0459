"use client";

import { usePathname } from "next/navigation";
import { PlaceNav, type Place } from "@/components/shell/PlaceNav";
import type { PlaceMarkName } from "@/components/shell/PlaceMark";

type Props = { project: string; failing: number; doubtful: number; toMend: number; faults: number; canEdit: boolean };

/** A unit's pages belong to the bench: that is where one is with it. */
const PLACES: readonly { path: string; label: string; mark: PlaceMarkName; also?: string; underThumb?: true }[] = [
  { path: "rack", label: "Rack", mark: "rack", underThumb: true },
  { path: "bench", label: "Bench", mark: "bench", underThumb: true, also: "units" },
  { path: "wiring", label: "Wiring", mark: "wiring" },
  { path: "parts", label: "Parts", mark: "parts" },
  { path: "captures", label: "Captures", mark: "captures", underThumb: true },
  { path: "faults", label: "Faults", mark: "faults" },
  { path: "log", label: "Log", mark: "log", underThumb: true },
  { path: "boards", label: "Boards", mark: "boards" },
  { path: "people", label: "People", mark: "people" },
  { path: "settings", label: "Settings", mark: "settings" },
];

export function ProjectPlaces({ project, failing, doubtful, toMend, faults, canEdit }: Props) {
  const pathname = usePathname();
  const base = `/projects/${project}/`;
  const current = pathname.startsWith(base) ? pathname.slice(base.length).split("/")[0] : "";
  const places = PLACES.filter(({ path }) => canEdit || path !== "settings").map(
    ({ path, label, mark, also, underThumb = false }): Place => ({
      href: base + path,
      label,
      mark,
      underThumb,
      isCurrent: current === path || (also !== undefined && current === also),
      ...(path === "bench"
        ? { count: failing + doubtful, countLabel: `(${failing} failing, ${doubtful} in doubt)` }
        : {}),
      ...(path === "wiring" ? { count: toMend, countLabel: "(findings to mend)" } : {}),
      ...(path === "faults" ? { count: faults, countLabel: "(not mended)" } : {}),
    }),
  );
  return <PlaceNav places={places} />;
}
