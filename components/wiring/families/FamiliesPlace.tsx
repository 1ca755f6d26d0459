"use client";

import { Page } from "@/components/shell/Page";
import { Button } from "@/components/ui/Button";
import { EmptyState } from "@/components/ui/EmptyState";
import { Notice } from "@/components/ui/Notice";
import { Panel } from "@/components/ui/Panel";
import { counted } from "@/components/workshop/counted";
import type { FamiliesView } from "@/lib/family/load-families";
import type { FamilyActs } from "./family-acts";
import { FamilyDialog } from "./FamilyDialog";
import { FamilyTable } from "./FamilyTable";

type Props = FamiliesView & FamilyActs & { project: string; canEdit: boolean };

/** The figures that levels, loading and pull-ups are reckoned with: the project's own before the generic ones. */
export function FamiliesPlace({ own, builtIn, unknown, project, canEdit, save, remove }: Props) {
  const acts = canEdit ? { save, remove } : undefined;
  return (
    <Page
      title="Families"
      lede="What each logic family promises at worst. Levels, loading and pull-ups of every net are reckoned with these figures."
      actions={
        canEdit && (
          <FamilyDialog project={project} save={save} trigger={<Button kind="primary">Enter a data sheet</Button>} />
        )
      }
    >
      <div className="flex min-w-0 flex-col gap-5">
        {unknown.length > 0 && (
          <Notice kind="caution" title="Pins name families that nobody knows">
            <p>
              {unknown.map(({ name, pins }) => `${name} (${counted(pins, "pin")})`).join(", ")}. Their levels are not
              looked at until the figures are entered, or the pins name a family of the table.
            </p>
          </Notice>
        )}
        {own.length > 0 ? (
          <Panel title="From data sheets" note={counted(own.length, "family", "families")}>
            <FamilyTable label="Families from data sheets" lines={own} project={project} acts={acts} />
          </Panel>
        ) : (
          <EmptyState title="No figures of your own yet">
            The table below is generic: worst case over temperature, as most makers state it. Where your parts are
            better, or of a family that is not listed, enter what their data sheet says. Figures under a name of the
            table take its place.
          </EmptyState>
        )}
        <Panel title="Built in" note={counted(builtIn.length, "family", "families")}>
          <p className="mb-3 max-w-prose text-sm text-ink-soft">
            Worst case over temperature at the supply given; magnitudes, without the signs of direction. Follows JESD7-A
            for HC and HCT and the sheets named under each family. Leaves out: the spread between makers, and anything
            beyond the supply range. A planning aid, never a proof of safety.
          </p>
          <FamilyTable label="Built-in families" lines={builtIn} project={project} acts={acts} />
        </Panel>
      </div>
    </Page>
  );
}
