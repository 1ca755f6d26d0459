"use client";

import { useAct } from "@/components/board/use-act";
import { DateTime } from "@/components/ui/DateTime";
import { IconButton } from "@/components/ui/IconButton";
import { Panel } from "@/components/ui/Panel";
import type { SaidLine } from "@/lib/order/board-order-view";
import type { BoardOrderActs } from "./order-acts";

type Props = { said: readonly SaidLine[]; project: string; zone: string; withdraw: BoardOrderActs["withdraw"] | null };

/** What people say about the order, with who said it and why. */
export function SaidPanel({ said, project, zone, withdraw }: Props) {
  const { act } = useAct();
  return (
    <Panel title="Said by you and others">
      {said.length === 0 ? (
        <p className="text-[0.9375rem] text-ink-soft">
          Nothing yet. The order comes from the pins’ roles and from what feeds the rails.
        </p>
      ) : (
        <ul>
          {said.map(({ id, words, reason, by, at }) => (
            <li key={id} className="flex items-start gap-2 border-b border-rule py-2 last:border-b-0">
              <span className="min-w-0 flex-1">
                <span className="font-semibold">{words}</span>
                {reason !== "" && <span className="block text-[0.9375rem]">{reason}</span>}
                <span className="block text-sm text-ink-soft">
                  {by}, <DateTime at={at} zone={zone} form="day" />
                </span>
              </span>
              {withdraw && (
                <IconButton
                  icon="close"
                  label={`Withdraw: ${words}`}
                  onPress={() =>
                    void act(
                      () => withdraw({ project, writeId: crypto.randomUUID(), id }),
                      () => `Withdrawn: ${words}.`,
                    )
                  }
                />
              )}
            </li>
          ))}
        </ul>
      )}
    </Panel>
  );
}
