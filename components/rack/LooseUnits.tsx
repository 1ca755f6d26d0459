import Link from "next/link";
import { Panel } from "@/components/ui/Panel";
import type { RackUnit } from "@/lib/rack/rack-view";
import { CardStages } from "./CardStages";
import { unitAddress } from "./rack-addresses";
import { ToMend } from "./ToMend";

/** Units that lie on the shelf or on the bench instead of in a slot. */
export function LooseUnits({ units, project }: { units: readonly RackUnit[]; project: string }) {
  if (units.length === 0) return null;
  return (
    <Panel title="Not in a slot" note={units.length === 1 ? "1 unit" : `${units.length} units`} padding="none">
      <ul className="@container flex flex-col border-t border-rule">
        {units.map((unit) => (
          <li key={unit.id} className="border-b border-rule last:border-b-0">
            <Link
              href={unitAddress(project, unit.serial)}
              className="grid items-center gap-x-4 gap-y-2 rounded-lg px-4 py-3 no-underline hover:bg-raised sm:px-5 @3xl:grid-cols-[minmax(9rem,1.15fr)_5.5rem_minmax(25rem,2.9fr)]"
            >
              <span className="font-head text-[1.0625rem] font-semibold leading-tight tracking-tight">
                {unit.board.name}
              </span>
              <span className="mono flex flex-wrap gap-x-2.5 text-sm leading-tight @3xl:flex-col">
                <span className="font-semibold">{unit.serial}</span>
                <span className="text-xs text-ink-soft">rev {unit.revision}</span>
                <ToMend board={unit.board} />
              </span>
              <span className="hidden @3xl:block">
                <CardStages unit={unit} />
              </span>
              <span className="@3xl:hidden">
                <CardStages unit={unit} layout="flow" />
              </span>
            </Link>
          </li>
        ))}
      </ul>
    </Panel>
  );
}
