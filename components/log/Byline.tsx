import Link from "next/link";
import { DateTime } from "@/components/ui/DateTime";
import type { EntryView } from "@/lib/log-entry/entry-view";

/** Who wrote it, when, about which unit. */
export function Byline({ project, zone, entry }: { project: string; zone: string; entry: EntryView }) {
  const { unit, editedAt } = entry;
  return (
    <>
      {entry.by.name}, <DateTime at={entry.at} zone={zone} />
      {unit && (
        <>
          , about{" "}
          <Link href={`/projects/${project}/units/${encodeURIComponent(unit.serial)}`} className="link mono text-xs">
            {unit.serial}
          </Link>
        </>
      )}
      {editedAt && (
        <>
          . Edited <DateTime at={editedAt} zone={zone} />
        </>
      )}
    </>
  );
}
