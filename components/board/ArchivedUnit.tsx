"use client";

import Link from "next/link";
import { useRouter } from "next/navigation";
import { toast } from "@/components/ui/toast-store";
import { PurgeDialog } from "@/components/workshop/PurgeDialog";
import type { BoardUnit } from "@/lib/board/load-board";
import type { UnitActs } from "./board-acts";
import { RestoreUnit } from "./RestoreUnit";
import { whatGoesWithUnit } from "./what-goes";

type Props = {
  project: string;
  unit: BoardUnit;
  can: { restore: boolean; purge: boolean };
  acts: Pick<UnitActs, "restore" | "purge">;
};

/** A unit that was put away: it can be looked at, brought back, or removed for good. */
export function ArchivedUnit({ project, unit, can, acts }: Props) {
  const router = useRouter();
  const { id: unitId, serial, holds } = unit;
  return (
    <li className="flex flex-wrap items-center gap-3">
      <Link href={`/projects/${project}/units/${serial}`} className="link mono text-sm">
        {serial}
      </Link>
      {can.restore && <RestoreUnit project={project} unit={unit} restore={acts.restore} />}
      {can.purge && holds && (
        <PurgeDialog
          what="it"
          name={serial}
          size="sm"
          ask={`Type the serial number: ${serial}`}
          consequences={whatGoesWithUnit(holds)}
          purge={(asked) => acts.purge({ project, unitId, ...asked })}
          onGone={() => {
            toast({ text: `${serial} is gone for good.` });
            router.refresh();
          }}
        />
      )}
    </li>
  );
}
