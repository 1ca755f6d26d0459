import { OutdatedNotice } from "@/components/parts/OutdatedNotice";
import { PackageRack } from "@/components/parts/PackageRack";
import { SpareList } from "@/components/parts/SpareList";
import { ButtonLink } from "@/components/ui/ButtonLink";
import { Panel } from "@/components/ui/Panel";
import { counted } from "@/components/workshop/counted";
import type { BoardSpares } from "@/lib/board-plan/load-board-spares";

type Props = { project: string; zone: string; code: string; spares: BoardSpares };

/** The packages of the board, and where a gate is left over that a rework can use. */
export function PackagesPanel({ project, zone, code, spares: { packages, spares, tied, outdated } }: Props) {
  return (
    <Panel
      title="Packages"
      note={`${packages.length}, ${spares.length === 0 ? "no gate to spare" : `${counted(spares.length, "gate")} to spare`}`}
      actions={
        <ButtonLink size="sm" href={`/projects/${project}/parts/boards/${code}`}>
          Its parts
        </ButtonLink>
      }
    >
      <div className="flex flex-col gap-4">
        <OutdatedNotice project={project} zone={zone} units={outdated} />
        <PackageRack packages={packages} spares={spares} />
        {spares.length > 0 && (
          <div className="flex flex-col gap-2">
            <SpareList spares={spares} />
            <p className="text-sm text-ink-soft">
              {tied
                ? "The ties are on the drawing: cut the tie before a rework uses the gate."
                : "Nobody has said yet that these inputs are tied."}
            </p>
          </div>
        )}
      </div>
    </Panel>
  );
}
