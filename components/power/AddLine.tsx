"use client";

import { useState, type ReactElement } from "react";
import { useAct } from "@/components/board/use-act";
import { Dialog } from "@/components/ui/Dialog";
import { Select } from "@/components/ui/Select";
import type { PowerLineItem } from "@/lib/power/line-item";
import { LINE_KINDS, lineWords } from "@/lib/power/line-kinds";
import { LineForm } from "./LineForm";
import type { PowerActs } from "./power-acts";

type Props = {
  project: string;
  board: string;
  rails: readonly string[];
  save: PowerActs["saveLine"];
  trigger: ReactElement;
};

/** First what it is, then its figures. */
export function AddLine({ project, board, rails, save, trigger }: Props) {
  const { act } = useAct();
  const [kind, setKind] = useState<PowerLineItem["kind"]>("led");
  const about = LINE_KINDS.find((one) => one.kind === kind)?.about;
  return (
    <Dialog title={`What ${board} draws`} trigger={trigger} isDismissable={false}>
      {(close) => (
        <div className="flex flex-col gap-4.5">
          <Select
            label="What it is"
            value={kind}
            onChange={(id) => setKind(LINE_KINDS.find((one) => one.kind === id)?.kind ?? kind)}
            options={LINE_KINDS.map((one) => ({ id: one.kind, label: one.name }))}
            description={about}
          />
          <LineForm
            key={kind}
            {...{ project, board, rails, save }}
            line={{ kind }}
            onCancel={close}
            onDone={(value) => {
              close();
              void act(
                async () => ({ ok: true, value }),
                ({ item }) => `${board}: ${lineWords(item)}. The budget and the wiring were worked out again.`,
              );
            }}
          />
        </div>
      )}
    </Dialog>
  );
}
