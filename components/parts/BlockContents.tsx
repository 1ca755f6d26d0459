import Link from "next/link";
import type { ReactNode } from "react";
import { Panel } from "@/components/ui/Panel";
import type { BlockLine } from "@/lib/block/load-blocks";

/** What a block holds, for those who may only read it. */
export function BlockContents({ home, block }: { home: string; block: BlockLine }) {
  const rows = [...block.gates, ...block.children];
  return (
    <Panel title="Holds">
      {rows.length === 0 ? (
        <p className="text-[0.9375rem] text-ink-soft">Nothing is counted in it yet.</p>
      ) : (
        <ul className="flex flex-col">
          {block.gates.map(({ gateFunction, name, count }) => (
            <Row key={gateFunction} count={count} note={count === 1 ? "gate" : "gates"}>
              {name}
            </Row>
          ))}
          {block.children.map(({ block: id, name, count }) => (
            <Row key={id} count={count} note={count === 1 ? "block" : "blocks"}>
              <Link href={`${home}/${id}`} className="link">
                {name}
              </Link>
            </Row>
          ))}
        </ul>
      )}
    </Panel>
  );
}

const Row = ({ count, note, children }: { count: number; note: string; children: ReactNode }) => (
  <li className="grid grid-cols-[3rem_minmax(0,1fr)_auto] gap-3 border-b border-rule py-1.5 last:border-b-0">
    <span className="mono text-right text-sm">{count} ×</span>
    <span>{children}</span>
    <span className="text-sm text-ink-soft">{note}</span>
  </li>
);
