"use client";

import { useAct } from "@/components/board/use-act";
import { Button } from "@/components/ui/Button";
import { Panel } from "@/components/ui/Panel";
import type { PunchItemView } from "@/lib/punch/load-punch";
import type { PunchActs } from "./punch-acts";
import { PunchLine } from "./PunchLine";

type Props = {
  project: string;
  zone: string;
  revision: { id: string; letter: string };
  items: readonly PunchItemView[];
  canEdit: boolean;
  acts: PunchActs;
};

/** What the units of the earlier revisions taught, to be ticked off before this one is ordered. */
export function PunchPanel({ project, zone, revision, items, canEdit, acts }: Props) {
  const { act, isPending } = useAct();
  const done = items.filter(({ dealtWith }) => dealtWith !== "").length;
  const take = () =>
    act(
      () => acts.take({ project, writeId: crypto.randomUUID(), revisionId: revision.id }),
      ({ items: taken }) =>
        taken === 0 ? "Nothing new to take." : `${taken} ${taken === 1 ? "item is" : "items are"} on the punch list.`,
    );
  return (
    <div id={`punch-${revision.letter}`} className="scroll-mt-6">
      <Panel
        title={`Punch list of revision ${revision.letter}`}
        note={items.length > 0 ? `${done} of ${items.length} dealt with` : undefined}
        actions={
          canEdit && (
            <Button size="sm" isPending={isPending} onPress={() => void take()}>
              {items.length === 0 ? "Take the punch list" : "Take what is new"}
            </Button>
          )
        }
      >
        {items.length === 0 ? (
          <p className="text-ink-soft max-w-prose">
            Faults that say what to change, standing concessions and reworks of the units made before: taken here, they
            are ticked off one by one, each with how it was dealt with.
          </p>
        ) : (
          <ul className="divide-rule divide-y">
            {items.map((item) => (
              <PunchLine key={item.id} {...{ project, zone, item, canEdit, acts }} />
            ))}
          </ul>
        )}
      </Panel>
    </div>
  );
}
