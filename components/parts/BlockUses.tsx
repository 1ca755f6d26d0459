import Link from "next/link";
import { Panel } from "@/components/ui/Panel";
import type { BlockView } from "@/lib/block/load-block";

/** On which boards and in which blocks it stands: who is touched by a change. */
export function BlockUses({ project, view }: { project: string; view: BlockView }) {
  const { uses, parents } = view;
  const home = `/projects/${project}/parts`;
  return (
    <Panel title="Where it is used">
      {uses.length + parents.length === 0 ? (
        <p className="text-sm text-ink-soft">Nowhere yet. Put it on a board, or into another block.</p>
      ) : (
        <ul className="flex flex-col gap-2.5 text-[0.9375rem]">
          {uses.map(({ code, name, count, through, units }) => (
            <li key={code}>
              <Link href={`${home}/boards/${code}`} className="link">
                <span className="mono text-sm">{code}</span> {name}
              </Link>{" "}
              <span className="mono whitespace-nowrap text-sm">× {count}</span>
              <span className="block text-sm text-ink-soft">
                {[
                  through.length > 0 ? `through ${through.join(" and ")}` : "",
                  units.length > 0 ? `built: ${units.join(", ")}` : "none built yet",
                ]
                  .filter(Boolean)
                  .join("; ")}
              </span>
            </li>
          ))}
          {parents.map(({ id, name, count }) => (
            <li key={id}>
              in{" "}
              <Link href={`${home}/blocks/${id}`} className="link">
                {name}
              </Link>{" "}
              <span className="mono whitespace-nowrap text-sm">× {count}</span>
            </li>
          ))}
        </ul>
      )}
    </Panel>
  );
}
