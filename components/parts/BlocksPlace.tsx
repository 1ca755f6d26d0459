"use client";

import Link from "next/link";
import { useAct } from "@/components/board/use-act";
import { Page } from "@/components/shell/Page";
import { ButtonLink } from "@/components/ui/ButtonLink";
import { EmptyState } from "@/components/ui/EmptyState";
import { Panel } from "@/components/ui/Panel";
import { Table } from "@/components/ui/Table";
import { ArchivedList } from "@/components/workshop/ArchivedList";
import type { BlockLine } from "@/lib/block/load-blocks";
import { BlockDrawing } from "./BlockDrawing";
import { columnsFor, PhoneBlock } from "./block-columns";
import type { BlockActs } from "./parts-acts";

type Props = { project: string; blocks: readonly BlockLine[]; canEdit: boolean; restore: BlockActs["restore"] };

export function BlocksPlace({ project, blocks, canEdit, restore }: Props) {
  const { act } = useAct();
  const inWork = blocks.filter((block) => !block.archived);
  const archived = blocks.filter((block) => block.archived);
  const add = (
    <ButtonLink kind="primary" href={`/projects/${project}/parts/blocks/new`}>
      Add a block
    </ButtonLink>
  );
  return (
    <Page
      title="Blocks"
      lede="Sub-circuits that are used again and again. A block counts its gates and the blocks inside it; boards count blocks."
      actions={canEdit && inWork.length > 0 && add}
    >
      <div className="flex flex-col gap-6">
        {inWork.length === 0 ? (
          <EmptyState title="No blocks yet" drawing={<BlockDrawing />} action={canEdit && add}>
            <p>
              Begin with the smallest thing you build more than once, such as a full adder: two XOR, two AND, one OR.
              Then put four of them into an adder. Boards that use blocks get their packages, spare gates and capacitors
              counted.
            </p>
          </EmptyState>
        ) : (
          <Panel>
            <Table<BlockLine>
              label="Blocks"
              columns={columnsFor(project)}
              rows={inWork}
              rowKey={(block) => block.id}
              {...(inWork.length > 8 ? { search: "Find a block" } : {})}
              phone={(block) => <PhoneBlock project={project} block={block} />}
              empty={null}
            />
          </Panel>
        )}
        <ArchivedList
          what="archived block"
          items={archived}
          keyOf={({ id }) => id}
          nameOf={({ name }) => name}
          show={({ id, name }) => (
            <Link href={`/projects/${project}/parts/blocks/${id}`} className="link">
              {name}
            </Link>
          )}
          restore={
            canEdit
              ? ({ id, name }) =>
                  void act(
                    () => restore({ project, writeId: crypto.randomUUID(), block: id }),
                    () => `${name} is back.`,
                  )
              : undefined
          }
        />
      </div>
    </Page>
  );
}
