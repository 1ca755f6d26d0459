"use client";

import { useState } from "react";
import { useAct } from "@/components/board/use-act";
import type { OfferAct } from "@/components/offer/offer-acts";
import { Page } from "@/components/shell/Page";
import { Button } from "@/components/ui/Button";
import { EmptyState } from "@/components/ui/EmptyState";
import { Panel } from "@/components/ui/Panel";
import { ArchivedList } from "@/components/workshop/ArchivedList";
import type { DelayPathLine, DelayView } from "@/lib/delay-path/load-delay-paths";
import { DelayEditor } from "./DelayEditor";
import { DelaySheet } from "./DelaySheet";
import type { DelayActs } from "./parts-acts";

type Props = {
  project: string;
  view: DelayView;
  can: { edit: boolean; editProcedure: boolean };
  acts: DelayActs & { offer: OfferAct };
};

export function DelayPlace({ project, view, can, acts }: Props) {
  const { act } = useAct();
  /** Id of the path that is being changed; "": a new one. */
  const [edited, setEdited] = useState<string>();
  const inWork = view.paths.filter((path) => !path.archived);
  const archived = view.paths.filter((path) => path.archived);
  const write = (path: DelayPathLine) => ({ project, writeId: crypto.randomUUID(), id: path.id });
  const restore = (path: DelayPathLine) =>
    act(
      () => acts.restore(write(path)),
      ({ name }) => `${name} is back.`,
    );
  const archive = (path: DelayPathLine) =>
    void act(
      () => acts.archive(write(path)),
      ({ name }) => `${name} is archived.`,
      () => restore(path),
    );
  const editor = (path: DelayPathLine | undefined) => (
    <DelayEditor
      project={project}
      view={view}
      line={path}
      save={acts.save}
      onCancel={() => setEdited(undefined)}
      onSaved={() => {
        setEdited(undefined);
        void act(
          async () => ({ ok: true, value: null }),
          () => "The path is saved.",
        );
      }}
    />
  );
  const add = can.edit && edited === undefined && (
    <Button kind="primary" onPress={() => setEdited("")}>
      Add a path
    </Button>
  );
  return (
    <Page
      title="Delay"
      lede="Chains of parts whose delay matters: what they take at least, typically and at worst, and what a capture of them may show. A planning aid: copper, slow edges and temperature beyond the data sheets are left out."
      actions={inWork.length > 0 && add}
    >
      <div className="flex flex-col gap-5">
        {edited === "" && <Panel title="New path">{editor(undefined)}</Panel>}
        {inWork.length === 0 && edited === undefined && (
          <EmptyState title="No delay paths yet" action={add}>
            <p>
              Begin with the slowest path there is, most often a carry that ripples through an adder. The path says how
              fast the clock may be, and hands its window to the capture check that measures it.
            </p>
          </EmptyState>
        )}
        {inWork.map((path) =>
          path.id === edited ? (
            <Panel key={path.id} title={path.name}>
              {editor(path)}
            </Panel>
          ) : (
            <DelaySheet
              key={path.id}
              project={project}
              view={view}
              line={path}
              can={can}
              offer={acts.offer}
              onEdit={() => setEdited(path.id)}
              onArchive={() => archive(path)}
            />
          ),
        )}
        <ArchivedList
          what="archived path"
          items={archived}
          keyOf={({ id }) => id}
          nameOf={({ name }) => name}
          show={({ name }) => name}
          restore={can.edit ? (path) => void restore(path) : undefined}
        />
      </div>
    </Page>
  );
}
