"use client";

import { useAct } from "@/components/board/use-act";
import { Button } from "@/components/ui/Button";
import { Dialog } from "@/components/ui/Dialog";
import { Panel } from "@/components/ui/Panel";
import type { Conditions } from "@/lib/plan-conditions/schema";
import { typedConditions } from "@/lib/plan-conditions/typed-conditions";
import { ConditionsForm } from "./ConditionsForm";
import type { PowerActs } from "./power-acts";

type Props = { project: string; conditions: Conditions; canEdit: boolean; save: PowerActs["saveConditions"] };

export function ConditionsPanel({ project, conditions, canEdit, save }: Props) {
  const { act } = useAct();
  const { ambientC, logicVolts, logicRail, pinCapacitancePf, sparesPercent, currency } = typedConditions(conditions);
  const rows = [
    ["Air at the connectors", ambientC],
    ["Logic", `${logicVolts} from ${logicRail}`],
    ["A connector pin adds", pinCapacitancePf],
    ["Spare parts to order", sparesPercent],
    ["Prices in", currency],
  ];
  return (
    <Panel
      title="Conditions"
      actions={
        canEdit && (
          <Dialog title="Conditions of the plan" trigger={<Button size="sm">Change</Button>}>
            {(close) => (
              <ConditionsForm
                {...{ project, conditions, save }}
                onCancel={close}
                onDone={() => {
                  close();
                  void act(
                    async () => ({ ok: true, value: null }),
                    () => "The conditions are saved. The wiring was checked again.",
                  );
                }}
              />
            )}
          </Dialog>
        )
      }
    >
      <dl className="grid grid-cols-[minmax(0,1fr)_auto] gap-x-4 gap-y-1.5 text-[0.9375rem]">
        {rows.map(([name, value]) => (
          <div key={name} className="contents">
            <dt className="text-ink-soft">{name}</dt>
            <dd className="mono text-right text-sm">{value}</dd>
          </div>
        ))}
      </dl>
    </Panel>
  );
}
