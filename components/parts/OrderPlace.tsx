"use client";

import { useQueryState } from "nuqs";
import { PrintButton } from "@/components/traveler/PrintButton";
import { Page } from "@/components/shell/Page";
import { buttonStyle } from "@/components/ui/button-style";
import { ButtonLink } from "@/components/ui/ButtonLink";
import { EmptyState } from "@/components/ui/EmptyState";
import { Kbd } from "@/components/ui/Kbd";
import { Notice } from "@/components/ui/Notice";
import { Panel } from "@/components/ui/Panel";
import { Select } from "@/components/ui/Select";
import { Table } from "@/components/ui/Table";
import { counted } from "@/components/workshop/counted";
import type { OrderLine, PartsListView } from "@/lib/parts-list/load-parts-list";
import { columnsFor, PhoneOrder } from "./order-columns";
import { OrderTotals } from "./OrderTotals";
import type { SparesAct, StockAct } from "./parts-acts";
import { SparesForm } from "./SparesForm";
import { useStockEdits } from "./use-stock-edits";

type Props = {
  project: string;
  view: PartsListView;
  canEdit: boolean;
  acts: { stock: StockAct; spares: SparesAct };
};

const ALL = "all";

export function OrderPlace({ project, view, canEdit, acts }: Props) {
  const [, setBoard] = useQueryState("board", { shallow: false, history: "push" });
  const edits = useStockEdits(project, acts.stock);
  const { lines, boards, board, problems, currency, spares } = view;
  const sheet = { project, currency, canEdit, edits };
  const file = `/api/projects/${project}/parts-list${board ? `?board=${encodeURIComponent(board)}` : ""}`;
  const isEmpty = lines.length === 0 && board === null;
  return (
    <Page
      title="To order"
      lede={
        isEmpty
          ? "Every part of every board, times the units to build, with spares, less what is in the drawer."
          : `${counted(lines.length, "part")} for ${unitsText(view)}, with ${spares.percent} % spares and at least ${spares.minimum} of each.`
      }
      actions={
        !isEmpty && (
          <>
            <a href={file} download className={buttonStyle()}>
              CSV out
            </a>
            <PrintButton />
          </>
        )
      }
    >
      <div className="flex flex-col gap-5">
        {problems.length > 0 && (
          <Notice kind="failed" role="status" title="The list is not whole">
            <ul>
              {problems.map((problem) => (
                <li key={problem}>{problem}</li>
              ))}
            </ul>
          </Notice>
        )}
        {isEmpty ? (
          <EmptyState
            title="Nothing to order yet"
            action={
              <ButtonLink kind="primary" href={`/projects/${project}/parts/boards`}>
                Say what the boards are made of
              </ButtonLink>
            }
          >
            <p>
              The list fills itself: packages and capacitors from the blocks that boards use, other parts from each
              board’s own list, times the units to build.
            </p>
          </EmptyState>
        ) : (
          <>
            <OrderTotals view={view} />
            <Panel>
              <Table<OrderLine>
                label="Parts to order"
                columns={columnsFor(sheet)}
                rows={lines}
                rowKey={({ part }) => part}
                pageSize={1000}
                isDense
                search="Find a part"
                toolbar={
                  <>
                    <Select
                      label="Board"
                      isLabelHidden
                      className="w-full sm:w-64"
                      value={board ?? ALL}
                      onChange={(code) => void setBoard(code === ALL ? null : code)}
                      options={[
                        { id: ALL, label: "All boards" },
                        ...boards.map(({ code, name, units }) => ({
                          id: code,
                          label: `${code} ${name}`,
                          description: counted(units, "unit"),
                        })),
                      ]}
                    />
                    {canEdit && (
                      <SparesForm key={spares.version} project={project} spares={spares} save={acts.spares} />
                    )}
                  </>
                }
                phone={(line) => <PhoneOrder line={line} {...sheet} />}
                empty={<p className="py-4 text-ink-soft">{board} carries no parts yet.</p>}
              />
              {canEdit && lines.length > 0 && (
                <p className="mt-3 flex flex-wrap items-center gap-x-2 gap-y-1 text-sm text-ink-soft max-sm:hidden">
                  <Kbd>Enter</Kbd> keep and go down <span>·</span> <Kbd>↑</Kbd> <Kbd>↓</Kbd> move <span>·</span>{" "}
                  <Kbd>Esc</Kbd> take back
                </p>
              )}
            </Panel>
          </>
        )}
      </div>
    </Page>
  );
}

function unitsText({ boards, board }: PartsListView): string {
  const shown = boards.filter(({ code }) => board === null || code === board);
  const units = shown.reduce((sum, one) => sum + one.units, 0);
  return board === null
    ? `${counted(units, "unit")} of ${counted(boards.length, "board")}`
    : `${counted(units, "unit")} of ${board}`;
}
