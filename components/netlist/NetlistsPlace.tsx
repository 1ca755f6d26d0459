import { Page } from "@/components/shell/Page";
import { ButtonLink } from "@/components/ui/ButtonLink";
import { EmptyState } from "@/components/ui/EmptyState";
import type { NetlistsView } from "@/lib/netlist/load-netlists";
import { DifferencePanel } from "./DifferencePanel";
import { TakeNetlist } from "./TakeNetlist";
import { VersionsPanel } from "./VersionsPanel";

type Props = NetlistsView & { project: string; zone: string; canTake: boolean };

/** What the copper of a board should join, version by version. */
export function NetlistsPlace({ board, revisions, versions, pinMap, difference, project, zone, canTake }: Props) {
  const self = `/projects/${project}/boards/${encodeURIComponent(board.code)}`;
  return (
    <Page
      title={
        <>
          <span className="mono text-[0.8em]">{board.code}</span> Netlists
        </>
      }
      lede="What the copper of each revision should join. Rounds of probing are planned from a version and keep it."
      actions={<ButtonLink href={self}>Back to {board.name}</ButtonLink>}
    >
      <div className="flex min-w-0 flex-col gap-5">
        {difference && <DifferencePanel difference={difference} versions={versions} />}
        {versions.length === 0 ? (
          <EmptyState title="No netlist yet">
            A netlist says which pins of {board.name} belong together. Take the IPC-D-356 file that went to the board
            house, a list of pins, or the pin map of this project; then its units can be probed.
          </EmptyState>
        ) : (
          <VersionsPanel versions={versions} compared={difference} address={`${self}/netlists`} zone={zone} />
        )}
        {canTake && <TakeNetlist project={project} revisions={revisions} pinMap={pinMap} />}
      </div>
    </Page>
  );
}
