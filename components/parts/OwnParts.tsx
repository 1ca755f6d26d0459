"use client";

import { useAct } from "@/components/board/use-act";
import { Badge } from "@/components/ui/Badge";
import { Button } from "@/components/ui/Button";
import { EmptyState } from "@/components/ui/EmptyState";
import { Panel } from "@/components/ui/Panel";
import { Table } from "@/components/ui/Table";
import type { TableColumn } from "@/components/ui/table-column";
import { ArchivedList } from "@/components/workshop/ArchivedList";
import { builtInName } from "@/lib/part/built-in-name";
import type { PartLine, PartsView } from "@/lib/part/load-parts";
import { PartDialog } from "./PartDialog";
import type { PartActs } from "./parts-acts";

type Props = { project: string; view: PartsView; canEdit: boolean; acts: PartActs };

/** What the project itself knows of parts: stock, price, notes, and logic data that the built-in table has not. */
export function OwnParts({ project, view, canEdit, acts }: Props) {
  const { act } = useAct();
  const inWork = view.parts.filter((part) => !part.archived);
  const archived = view.parts.filter((part) => part.archived);
  const write = (part: PartLine) => ({ project, writeId: crypto.randomUUID(), part: part.id });
  const restore = (part: PartLine) =>
    act(
      () => acts.restore(write(part)),
      ({ number }) => `${number} is back.`,
    );
  const archive = (part: PartLine) =>
    act(
      () => acts.archive(write(part)),
      ({ number }) => `${number} is archived. Its stock and price still count.`,
      () => restore(part),
    );
  const change = (part: PartLine) => (
    <span className="flex flex-wrap justify-end gap-1.5">
      <PartDialog project={project} currency={view.currency} part={part} save={acts.save} />
      <Button size="sm" kind="quiet" aria-label={`Archive ${part.number}`} onPress={() => void archive(part)}>
        Archive
      </Button>
    </span>
  );
  const columns: TableColumn<PartLine>[] = [
    {
      id: "number",
      header: "Part",
      isRowHeader: true,
      sortBy: ({ number }) => number,
      cell: (part) => (
        <span className="flex flex-wrap items-baseline gap-x-2">
          <span className="mono text-sm">{part.number}</span>
          {part.logic && <Badge tone="copper">logic data</Badge>}
        </span>
      ),
    },
    {
      id: "description",
      header: "What it is",
      searchIn: ({ number, description, note, logic }) =>
        `${description} ${note} ${logic?.name ?? ""} ${builtInName(number) ?? ""}`,
      cell: ({ number, description, note, logic }) => (
        <span className="flex flex-col">
          {description || logic?.name || <span className="text-ink-soft">{builtInName(number)}</span>}
          {note && <span className="line-clamp-1 text-sm text-ink-soft">{note}</span>}
        </span>
      ),
    },
    {
      id: "stock",
      header: "In stock",
      align: "end",
      mono: true,
      sortBy: ({ stock }) => stock,
      cell: ({ stock }) => stock,
    },
    {
      id: "price",
      header: `Price, ${view.currency}`,
      align: "end",
      mono: true,
      sortBy: ({ price }) => (price === "" ? null : Number(price)),
      cell: ({ price }) => price || "–",
    },
    ...(canEdit ? [{ id: "acts", header: "Change", isHeaderHidden: true, align: "end" as const, cell: change }] : []),
  ];
  const add = <PartDialog project={project} currency={view.currency} save={acts.save} />;
  return (
    <Panel title="Your own parts" note={inWork.length > 0 ? String(inWork.length) : undefined} actions={canEdit && add}>
      <Table<PartLine>
        label="Your own parts"
        columns={columns}
        rows={inWork}
        rowKey={({ id }) => id}
        isDense
        {...(inWork.length > 10 ? { search: "Find a part" } : {})}
        phone={(part) => (
          <div className="flex flex-col gap-1 border-b border-rule pb-2.5">
            <span className="flex flex-wrap items-baseline gap-x-2">
              <span className="mono text-sm font-semibold">{part.number}</span>
              {part.logic && <Badge tone="copper">logic data</Badge>}
            </span>
            {(part.description || part.logic?.name) && <span>{part.description || part.logic?.name}</span>}
            <span className="flex flex-wrap items-center justify-between gap-2 text-sm text-ink-soft">
              <span>
                {part.stock} in stock{part.price && `, ${part.price} ${view.currency} each`}
              </span>
              {canEdit && change(part)}
            </span>
          </div>
        )}
        empty={
          <EmptyState title="No parts of your own yet">
            <p>
              A part gets here with its first stock or price on the list to order, or when you add one: a memory, a
              converter, or a logic part whose data sheet you want to count with.
            </p>
          </EmptyState>
        }
      />
      <div className="mt-3 empty:hidden">
        <ArchivedList
          what="archived part"
          items={archived}
          keyOf={({ id }) => id}
          nameOf={({ number }) => number}
          show={({ number }) => <span className="mono text-sm">{number}</span>}
          restore={canEdit ? (part) => void restore(part) : undefined}
        />
      </div>
    </Panel>
  );
}
