"use client";

import { useRouter } from "next/navigation";
import { Pagination } from "@/components/ui/Pagination";
import { capturesAddress } from "@/lib/attachment/captures-address";
import type { CapturesQuery, CapturesView } from "@/lib/attachment/load-captures";

type Props = { project: string; query: CapturesQuery; view: Pick<CapturesView, "page" | "pages" | "total"> };

export function CapturePages({ project, query, view }: Props) {
  const router = useRouter();
  return (
    <Pagination
      page={view.page}
      pages={view.pages}
      note={`${view.total} in all`}
      onPage={(page) => router.push(capturesAddress(project, { ...query, page }))}
    />
  );
}
