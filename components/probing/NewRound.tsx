"use client";

import { useRouter } from "next/navigation";
import { useState } from "react";
import type { z } from "zod";
import { Button } from "@/components/ui/Button";
import type { Reply } from "@/components/ui/form/reply";
import { useSubmit } from "@/components/ui/form/useSubmit";
import { Notice } from "@/components/ui/Notice";
import { Panel } from "@/components/ui/Panel";
import { Select } from "@/components/ui/Select";
import { counted } from "@/components/workshop/counted";
import { Disclosure } from "@/components/workshop/Disclosure";
import type { RoundsView } from "@/lib/probing/load-rounds";
import type { startRoundInput } from "@/lib/probing/schema";
import { PlanFigures } from "./PlanFigures";
import { ProbeList } from "./ProbeList";
import { RoundOptions } from "./RoundOptions";
import { useNewRound, type Preview } from "./use-new-round";

export type RoundActs = {
  preview: Preview;
  start: (input: z.input<typeof startRoundInput>) => Promise<Reply<{ id: string }>>;
};

type Props = {
  project: string;
  view: RoundsView;
  chosen: NonNullable<RoundsView["chosen"]>;
  acts: RoundActs;
};

const NO_CHECK = "none";

/** A round before it is one: options, what they come to, and the start. */
export function NewRound({ project, view, chosen, acts }: Props) {
  const router = useRouter();
  const state = useNewRound(project, chosen.id, acts.preview);
  const { options, shown, refused, isPlanning } = state;
  const [checkId, setCheck] = useState(view.checks[0]?.id ?? NO_CHECK);
  const { submit, isPending, error } = useSubmit(acts.start, {
    onDone: ({ id }) => router.push(`/projects/${project}/probe/${id}`),
  });
  const self = `/projects/${project}/units/${encodeURIComponent(view.unit.serial)}/probing`;
  const start = () =>
    submit({
      ...{ project, unit: view.unit.serial, netlistId: chosen.id, options },
      writeId: crypto.randomUUID(),
      checkId: checkId === NO_CHECK ? null : checkId,
    });
  return (
    <Panel title="A new round">
      <div className="flex flex-col gap-6">
        <div className="flex flex-wrap gap-x-8 gap-y-4">
          <Select
            label="Netlist"
            className="w-60"
            options={view.netlists.map(({ id, letter, number, isOwnRevision }) => ({
              id,
              label: `Rev ${letter}, netlist ${number}`,
              ...(isOwnRevision ? {} : { description: `This unit is revision ${view.unit.letter}.` }),
            }))}
            value={chosen.id}
            onChange={(id) => router.replace(`${self}?netlist=${id}`, { scroll: false })}
          />
          {view.checks.length > 0 && (
            <Select
              label="Becomes an attempt of"
              className="w-72"
              options={[
                ...view.checks.map(({ id, title }) => ({ id, label: title })),
                { id: NO_CHECK, label: "No check" },
              ]}
              value={checkId}
              onChange={setCheck}
            />
          )}
        </div>
        <RoundOptions state={state} chosen={chosen} />
        <div aria-live="polite" className="flex flex-col gap-4 border-t border-rule pt-5">
          {refused && <Notice kind="error">{Object.values(refused.fields ?? {})[0] ?? refused.message}</Notice>}
          {!shown && !refused && <p className="text-ink-soft">Planning the order of the probes…</p>}
          {shown && (
            <div className={isPlanning ? "opacity-60" : undefined}>
              <PlanFigures figures={shown.figures} count={shown.count} pace={view.pace} />
              <div className="mt-3">
                <Disclosure summary="The probes in their order">
                  <ProbeList
                    label="Probes in their order"
                    points={shown.points}
                    probes={shown.probes.map((probe, number) => ({ number, probe }))}
                  />
                  {shown.count > shown.probes.length && (
                    <p className="mt-2 text-sm text-ink-soft">
                      The first {shown.probes.length.toLocaleString("en-GB")} of {counted(shown.count, "probe")}.
                    </p>
                  )}
                </Disclosure>
              </div>
            </div>
          )}
        </div>
        {error && <Notice kind="failed">{error.message}</Notice>}
        <div>
          <Button
            kind="primary"
            isDisabled={!shown || shown.count === 0 || isPlanning}
            isPending={isPending}
            onPress={() => void start()}
          >
            {shown ? `Start with ${counted(shown.count, "probe")}` : "Start"}
          </Button>
        </div>
      </div>
    </Panel>
  );
}
