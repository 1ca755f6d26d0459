"use client";

import { Page } from "@/components/shell/Page";
import type { PartsView } from "@/lib/part/load-parts";
import { LogicList } from "./LogicList";
import { OwnParts } from "./OwnParts";
import type { PartActs } from "./parts-acts";

type Props = { project: string; view: PartsView; canEdit: boolean; acts: PartActs };

export function LogicPlace({ project, view, canEdit, acts }: Props) {
  const own = view.parts.flatMap(({ logic, archived }) => (logic && !archived ? [logic] : []));
  return (
    <Page
      title="Logic parts"
      lede="Common functions of the 74 series with their pins and figures, and parts of your own beside them. Packing, power and delay count with these."
    >
      <div className="flex flex-col gap-6">
        <LogicList own={own} />
        <OwnParts project={project} view={view} canEdit={canEdit} acts={acts} />
      </div>
    </Page>
  );
}
