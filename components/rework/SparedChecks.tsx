"use client";

import { Button } from "@/components/ui/Button";
import { TextField } from "@/components/ui/TextField";
import type { DoubtLineView } from "@/lib/rework/doubt-view";
import { DoubtTitle } from "./DoubtLines";
import type { Choice } from "./rework-draft";

type Props = {
  lines: readonly DoubtLineView[];
  serial: string;
  spared: readonly Choice[];
  onSpared: (list: Choice[]) => void;
};

/** A check that is being spared is listed from the moment of the press; without a reason it stays in doubt. */
export function SparedChecks({ lines, serial, spared, onSpared }: Props) {
  if (spared.length === 0) return null;
  return (
    <section>
      <h3 className="mb-1 text-base">Spared by hand</h3>
      <ul className="grid gap-3">
        {spared.map(({ checkId, reason }) => {
          const line = lines.find((one) => one.checkId === checkId);
          return (
            <li key={checkId} className="grid gap-1.5">
              <div className="flex items-baseline justify-between gap-3">
                {line ? (
                  <DoubtTitle line={line} serial={serial} />
                ) : (
                  <p className="text-ink-soft text-sm">No longer touched: it is left out.</p>
                )}
                <Button
                  size="sm"
                  kind="quiet"
                  onPress={() => onSpared(spared.filter((one) => one.checkId !== checkId))}
                  aria-label={`Do not spare “${line?.title ?? "it"}”`}
                >
                  Do not spare
                </Button>
              </div>
              <TextField
                label={`Why “${line?.title ?? "it"}” is spared`}
                isLabelHidden
                placeholder="Why it still holds; it stays on the traveler"
                value={reason}
                maxLength={300}
                onChange={(text) =>
                  onSpared(spared.map((one) => (one.checkId === checkId ? { checkId, reason: text } : one)))
                }
                error={reason.trim() === "" ? "Without a reason it stays in doubt." : undefined}
              />
            </li>
          );
        })}
      </ul>
    </section>
  );
}
