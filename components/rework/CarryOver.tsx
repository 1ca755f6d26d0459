"use client";

import { useRouter } from "next/navigation";
import { Button } from "@/components/ui/Button";
import { Menu } from "@/components/ui/Menu";
import type { ReworkView } from "@/lib/rework/rework-view";

type Props = { project: string; others: readonly string[]; rework: ReworkView };

/** The same rework on another unit of the board: its own record, its own doubt. */
export function CarryOver({ project, others, rework }: Props) {
  const router = useRouter();
  const go = (serial: string) =>
    router.push(`/projects/${project}/units/${encodeURIComponent(serial)}/reworks/new?from=${rework.id}`);
  return (
    <Menu
      label={`Carry R${rework.number} over to`}
      trigger={<Button size="sm">Carry it over</Button>}
      entries={others.map((serial) => ({ id: serial, label: `To ${serial}`, onAction: () => go(serial) }))}
    />
  );
}
