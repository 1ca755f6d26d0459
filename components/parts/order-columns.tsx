import Link from "next/link";
import type { TableColumn } from "@/components/ui/table-column";
import { money } from "@/lib/part/price";
import type { OrderLine } from "@/lib/parts-list/load-parts-list";
import { StockCell } from "./StockCell";
import type { StockEdits } from "./use-stock-edits";

type Sheet = { project: string; currency: string; canEdit: boolean; edits: StockEdits };

export function columnsFor({ project, currency, canEdit, edits }: Sheet): TableColumn<OrderLine>[] {
  return [
    {
      id: "part",
      header: "Part",
      isRowHeader: true,
      sortBy: ({ part }) => part,
      searchIn: ({ part, description }) => `${part} ${description}`,
      cell: (line) => (
        <span className="flex flex-col">
          <span className="mono text-sm">{line.part}</span>
          <span className="text-sm font-normal text-ink-soft">{line.description}</span>
          <Failure line={line} edits={edits} />
        </span>
      ),
    },
    { id: "boards", header: "On", searchIn: boardsText, cell: (line) => <Boards project={project} line={line} /> },
    {
      id: "needed",
      header: "Needed",
      align: "end",
      mono: true,
      sortBy: ({ needed }) => needed,
      cell: ({ needed }) => needed,
    },
    {
      id: "spares",
      header: "Spares",
      align: "end",
      mono: true,
      sortBy: ({ spares }) => spares,
      cell: ({ spares }) => spares,
    },
    {
      id: "stock",
      header: "In stock",
      align: "end",
      mono: true,
      sortBy: ({ stock }) => stock,
      cell: (line) => (canEdit ? <StockCell line={line} field="stock" edits={edits} label="In stock" /> : line.stock),
    },
    {
      id: "toBuy",
      header: "To buy",
      align: "end",
      mono: true,
      sortBy: ({ toBuy }) => toBuy,
      cell: (line) => <ToBuy line={line} />,
    },
    {
      id: "price",
      header: `Price, ${currency}`,
      align: "end",
      mono: true,
      sortBy: ({ price }) => price?.minor,
      cell: (line) =>
        canEdit ? <StockCell line={line} field="price" edits={edits} label="Price of one" /> : line.priceTyped || "–",
    },
    {
      id: "cost",
      header: `Cost, ${currency}`,
      align: "end",
      mono: true,
      sortBy: ({ costMinor }) => costMinor,
      cell: ({ costMinor }) => (costMinor === null ? "–" : money(costMinor, "").trim()),
    },
  ];
}

const ToBuy = ({ line }: { line: OrderLine }) => (
  <span className={line.toBuy > 0 ? "font-semibold" : "text-ink-soft"}>{line.toBuy > 0 ? line.toBuy : "–"}</span>
);

const boardsText = ({ perBoard }: OrderLine) => perBoard.map(({ code }) => code).join(" ");

/** "SUM 1 × 8": units times pieces a unit. */
function Boards({ project, line }: { project: string; line: OrderLine }) {
  return (
    <span className="flex flex-wrap gap-x-3 gap-y-0.5 text-sm">
      {line.perBoard.map(({ code, units, perUnit }) => (
        <span key={code} className="whitespace-nowrap">
          <Link
            href={`/projects/${project}/parts/boards/${code}`}
            className="mono inline-flex min-h-6 items-center hover:text-copper"
          >
            {code}
          </Link>{" "}
          <span className="text-ink-soft">{units === 1 ? perUnit : `${units} × ${perUnit}`}</span>
        </span>
      ))}
    </span>
  );
}

const Failure = ({ line, edits }: { line: OrderLine; edits: StockEdits }) => {
  const failure = edits.failureOf(line);
  return failure ? (
    <span role="alert" className="text-sm font-medium text-failed">
      {failure.text}
    </span>
  ) : null;
};

export function PhoneOrder({ line, project, currency, canEdit, edits }: Sheet & { line: OrderLine }) {
  return (
    <div className="flex flex-col gap-1.5 border-b border-rule pb-2.5">
      <span className="flex items-baseline justify-between gap-3">
        <span className="mono text-sm font-semibold">{line.part}</span>
        <span className="shrink-0 text-sm">
          {line.toBuy > 0 ? (
            <>
              buy <span className="mono font-semibold">{line.toBuy}</span>
            </>
          ) : (
            <span className="text-ink-soft">nothing to buy</span>
          )}
        </span>
      </span>
      {line.description && <span className="text-sm text-ink-soft">{line.description}</span>}
      <span className="flex flex-wrap gap-x-4 text-sm">
        <span className="text-ink-soft">
          {line.needed} needed{line.spares > 0 && `, ${line.spares} spare`}
        </span>
        <Boards project={project} line={line} />
      </span>
      <span className="flex flex-wrap items-center gap-x-4 gap-y-1.5 text-sm">
        <span className="flex items-center gap-1.5">
          in stock {canEdit ? <StockCell line={line} field="stock" edits={edits} label="In stock" /> : line.stock}
        </span>
        <span className="flex items-center gap-1.5">
          each{" "}
          {canEdit ? (
            <StockCell line={line} field="price" edits={edits} label="Price of one" />
          ) : (
            line.priceTyped || "–"
          )}{" "}
          {currency}
        </span>
      </span>
      <Failure line={line} edits={edits} />
    </div>
  );
}
