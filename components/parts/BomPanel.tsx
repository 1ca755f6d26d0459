"use client";

import { useState } from "react";
import { useAct } from "@/components/board/use-act";
import { Button } from "@/components/ui/Button";
import { EmptyState } from "@/components/ui/EmptyState";
import { Notice } from "@/components/ui/Notice";
import { Panel } from "@/components/ui/Panel";
import { counted } from "@/components/workshop/counted";
import { designatorClashes } from "@/lib/board-plan/designators";
import type { BoardPlanView } from "@/lib/board-plan/load-board-plan";
import type { PlacedPackage } from "@/lib/calc/packing";
import { BomForm } from "./BomForm";
import type { BoardPlanActs } from "./parts-acts";

type Props = {
  project: string;
  view: BoardPlanView;
  packages: readonly PlacedPackage[];
  canEdit: boolean;
  save: BoardPlanActs["saveBom"];
};

/** What the board carries besides the packages of its blocks. */
export function BomPanel({ project, view, packages, canEdit, save }: Props) {
  const { act } = useAct();
  const [isEditing, setEditing] = useState(false);
  const { lines } = view;
  const pieces = lines.reduce((sum, { count }) => sum + Number(count), 0);
  const clashes = designatorClashes(
    lines.map((line) => ({ ...line, count: Number(line.count) })),
    packages,
  );
  const edit = (label: string, kind: "primary" | "plain") =>
    canEdit && (
      <Button kind={kind} size={kind === "primary" ? "md" : "sm"} onPress={() => setEditing(true)}>
        {label}
      </Button>
    );
  if (isEditing) {
    return (
      <Panel title="Other parts">
        <BomForm
          project={project}
          view={view}
          save={save}
          onCancel={() => setEditing(false)}
          onSaved={() => {
            setEditing(false);
            void act(
              async () => ({ ok: true, value: null }),
              () => "The other parts are saved.",
            );
          }}
        />
      </Panel>
    );
  }
  return (
    <Panel
      title="Other parts"
      note={lines.length > 0 ? `${counted(lines.length, "line")}, ${counted(pieces, "piece")} a unit` : undefined}
      actions={lines.length > 0 && edit("Change the list", "plain")}
    >
      {clashes.length > 0 && (
        <Notice kind="doubtful" className="mb-3">
          <ul>
            {clashes.map((clash) => (
              <li key={clash}>{clash}</li>
            ))}
          </ul>
        </Notice>
      )}
      {lines.length === 0 ? (
        <EmptyState title="No other parts yet" action={edit("Add parts", "primary")}>
          <p>
            Memories, converters, lamps, resistors, connectors: everything that is no gate of a block. They go onto the
            list to order with the packages and their capacitors.
          </p>
        </EmptyState>
      ) : (
        <div className="overflow-x-auto" role="group" aria-label="Other parts, scrolls sideways" tabIndex={0}>
          <table aria-label="Other parts" className="w-full border-collapse text-left text-[0.9375rem]">
            <thead>
              <tr className="text-sm text-ink-soft">
                <th className="w-16 py-1.5 pr-4 text-right font-semibold">Count</th>
                <th className="py-1.5 pr-4 font-semibold">Part</th>
                <th className="py-1.5 pr-4 font-semibold">What it is</th>
                <th className="py-1.5 font-semibold">On the board</th>
              </tr>
            </thead>
            <tbody>
              {lines.map(({ partNumber, description, count, designators }, index) => (
                <tr key={index} className="border-t border-rule align-baseline">
                  <td className="mono py-1.5 pr-4 text-right text-sm">{count}</td>
                  <th scope="row" className="mono py-1.5 pr-4 text-sm">
                    {partNumber}
                  </th>
                  <td className="py-1.5 pr-4">{description}</td>
                  <td className="mono py-1.5 text-sm text-ink-soft">{designators}</td>
                </tr>
              ))}
            </tbody>
          </table>
        </div>
      )}
    </Panel>
  );
}
