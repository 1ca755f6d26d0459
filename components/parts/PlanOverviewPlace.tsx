"use client";

import { Page } from "@/components/shell/Page";
import { ButtonLink } from "@/components/ui/ButtonLink";
import { EmptyState } from "@/components/ui/EmptyState";
import { Panel } from "@/components/ui/Panel";
import { Table } from "@/components/ui/Table";
import { counted } from "@/components/workshop/counted";
import type { PlanLine, PlanOverview } from "@/lib/board-plan/load-plan-overview";
import { OutdatedNotice } from "./OutdatedNotice";
import { columnsFor, PhoneLine } from "./plan-columns";

type Props = { project: string; zone: string; view: PlanOverview };

export function PlanOverviewPlace({ project, zone, view }: Props) {
  const { lines, outdated } = view;
  const packages = lines.reduce((sum, line) => sum + line.packages, 0);
  return (
    <Page
      title="Parts of the boards"
      lede={
        packages > 0
          ? `${counted(packages, "package")} on ${counted(lines.filter((line) => line.packages > 0).length, "board")}, a unit of each. Choose a board to say which blocks it uses and what else it carries.`
          : "Which blocks each board uses, in which packages, and what else it carries."
      }
    >
      <div className="flex flex-col gap-5">
        <OutdatedNotice project={project} zone={zone} units={outdated} />
        <Panel>
          <Table<PlanLine>
            label="Boards and their parts"
            columns={columnsFor(project)}
            rows={lines}
            rowKey={({ code }) => code}
            phone={(line) => <PhoneLine project={project} line={line} />}
            empty={
              <EmptyState
                title="No boards yet"
                action={<ButtonLink href={`/projects/${project}/boards`}>Boards and slots</ButtonLink>}
              >
                <p>Add the boards of the machine first. Then say here what each is made of.</p>
              </EmptyState>
            }
          />
        </Panel>
      </div>
    </Page>
  );
}
