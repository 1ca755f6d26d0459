"use client";

import { useAct } from "@/components/board/use-act";
import { Button } from "@/components/ui/Button";
import { Dialog } from "@/components/ui/Dialog";
import { Panel } from "@/components/ui/Panel";
import { counted } from "@/components/workshop/counted";
import type { SupplyMargin } from "@/lib/calc/power";
import type { PowerView } from "@/lib/power/power-view";
import type { PowerActs } from "./power-acts";
import { RailForm } from "./RailForm";
import { RailLine } from "./RailLine";

type Props = {
  project: string;
  rails: PowerView["rails"];
  margins: readonly SupplyMargin[];
  sources: PowerView["sources"];
  canEdit: boolean;
  acts: Pick<PowerActs, "saveRail" | "removeRail">;
};

/** What each supply gives and what the machine takes of it. */
export function RailsPanel({ project, rails, margins, sources, canEdit, acts }: Props) {
  const { act } = useAct();
  return (
    <Panel
      title="Supply"
      note={counted(rails.length, "rail")}
      padding="none"
      actions={
        canEdit && (
          <Dialog title="Add a rail" trigger={<Button>Add a rail</Button>}>
            {(close) => (
              <RailForm
                {...{ project, sources }}
                rail={null}
                save={acts.saveRail}
                onCancel={close}
                onDone={(value, { name }) => {
                  close();
                  void act(
                    async () => ({ ok: true, value }),
                    () => `${name} is there. The wiring was checked again.`,
                  );
                }}
              />
            )}
          </Dialog>
        )
      }
    >
      <ul>
        {rails.map((rail) => (
          <RailLine
            key={rail.name}
            {...{ project, rail, sources, canEdit, acts }}
            margin={margins.find((one) => one.rail === rail.name)}
          />
        ))}
      </ul>
    </Panel>
  );
}
