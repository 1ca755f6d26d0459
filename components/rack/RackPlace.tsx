"use client";

import { parseAsStringLiteral, useQueryState } from "nuqs";
import { useEffect } from "react";
import { Page } from "@/components/shell/Page";
import { Button } from "@/components/ui/Button";
import { ButtonLink } from "@/components/ui/ButtonLink";
import { Kbd } from "@/components/ui/Kbd";
import { isTyping } from "@/components/ui/is-typing";
import { rackSentence } from "@/lib/rack/rack-sentence";
import type { RackView } from "@/lib/rack/rack-view";
import { LooseUnits } from "./LooseUnits";
import { NextOnTheBench } from "./NextOnTheBench";
import { MissingProcedures, RackBeginnings } from "./RackBeginnings";
import { RackTable } from "./RackTable";
import { SinceThen } from "./SinceThen";
import { StandingDrawing } from "./StandingDrawing";
import { StateLegend } from "./StateLegend";
import { WhenItRuns } from "./WhenItRuns";
import { TowerDrawing } from "./TowerDrawing";

type Props = {
  rack: RackView;
  project: string;
  zone: string;
  canEditBoards: boolean;
  canPlace: boolean;
  canRecord: boolean;
};

export function RackPlace({ rack, project, zone, canEditBoards, canPlace, canRecord }: Props) {
  const [as, setAs] = useQueryState("as", parseAsStringLiteral(["table"]));
  const isTable = as === "table";
  const nextSerial = rack.next[0]?.serial;

  useEffect(() => {
    function toggle(event: KeyboardEvent) {
      if (event.key !== "t" || event.ctrlKey || event.metaKey || event.altKey || isTyping(event.target)) return;
      event.preventDefault();
      void setAs(isTable ? null : "table");
    }
    window.addEventListener("keydown", toggle);
    return () => window.removeEventListener("keydown", toggle);
  }, [isTable, setAs]);

  const drawing = { rack, project, nextSerial };
  const beside = [
    <NextOnTheBench key="next" steps={rack.next} total={rack.total} project={project} />,
    <WhenItRuns key="outlook" outlook={rack.outlook} />,
    <SinceThen key="since" since={rack.since} zone={zone} />,
  ];
  // A standing rack and the table want the whole width.
  const isBeside = !isTable && (rack.layout === "tower" || rack.slots.length === 0);
  return (
    <Page
      title={rack.name}
      lede={rack.boards.length === 0 ? rack.summary : rackSentence(rack)}
      actions={
        <>
          <Button aria-keyshortcuts="t" onPress={() => void setAs(isTable ? null : "table")}>
            {isTable ? "As a drawing" : "As a table"} <Kbd className="max-sm:hidden">t</Kbd>
          </Button>
          {canRecord && rack.total > 0 && (
            <ButtonLink kind="primary" href={`/projects/${project}/bench`}>
              Go to the bench
            </ButtonLink>
          )}
        </>
      }
      {...(isBeside ? { aside: <>{beside}</> } : {})}
    >
      <div className="flex min-w-0 flex-col gap-5">
        {rack.slots.length === 0 && <RackBeginnings rack={rack} project={project} canEdit={canEditBoards} />}
        {rack.slots.length > 0 &&
          (isTable ? (
            <RackTable rack={rack} project={project} />
          ) : rack.layout === "tower" ? (
            <TowerDrawing {...drawing} canPlace={canPlace} />
          ) : (
            <>
              <StandingDrawing {...drawing} className="max-md:hidden" />
              <TowerDrawing {...drawing} canPlace={canPlace} className="md:hidden" />
            </>
          ))}
        {rack.total > 0 && !isTable && <StateLegend />}
        {!isBeside && <div className="grid items-start gap-4 lg:grid-cols-[minmax(0,2fr)_minmax(0,1fr)]">{beside}</div>}
        {rack.slots.length > 0 && <MissingProcedures rack={rack} project={project} />}
        {!isTable && <LooseUnits units={rack.loose} project={project} />}
      </div>
    </Page>
  );
}
