import { Page } from "@/components/shell/Page";
import type { OfferAct } from "@/components/offer/offer-acts";
import { PrintButton } from "@/components/traveler/PrintButton";
import { EmptyState } from "@/components/ui/EmptyState";
import { Notice } from "@/components/ui/Notice";
import { Panel } from "@/components/ui/Panel";
import type { OfferPlace } from "@/lib/offer/schema";
import type { PowerView } from "@/lib/power/power-view";
import { BoardPanel } from "./BoardPanel";
import { BudgetTable } from "./BudgetTable";
import { ConditionsPanel } from "./ConditionsPanel";
import { ContactsPanel } from "./ContactsPanel";
import { DropPanel } from "./DropPanel";
import { FirstPower } from "./FirstPower";
import type { PowerActs } from "./power-acts";
import { RailsPanel } from "./RailsPanel";
import { RulesPanel } from "./RulesPanel";

type Props = {
  project: string;
  view: PowerView;
  /** Code of the board that is looked at. */
  chosen: string;
  place: OfferPlace | undefined;
  can: { edit: boolean; editProcedure: boolean };
  acts: PowerActs & { offer: OfferAct };
};

/** What the boards draw, whether the supply, the contacts and the backplane bear it, and what a first power should show. */
export function PowerPlace({ project, view, chosen, place, can, acts }: Props) {
  const machine = view.machine.ok ? view.machine.value : null;
  const board = view.boards.find(({ code }) => code === chosen);
  const addressOf = (code: string) => `/projects/${project}/wiring/power?board=${encodeURIComponent(code)}#board`;
  return (
    <Page
      title="Power"
      lede={ledeOf(view)}
      actions={<PrintButton kind="plain" />}
      aside={
        <>
          <ConditionsPanel
            {...{ project, conditions: view.conditions, save: acts.saveConditions }}
            canEdit={can.edit}
          />
          <RulesPanel />
        </>
      }
    >
      {!view.machine.ok && (
        <Notice kind="error" title="The machine cannot be added up" role="none">
          {view.machine.message}
        </Notice>
      )}
      <RailsPanel
        {...{ project, acts, rails: view.rails, sources: view.sources }}
        margins={machine?.margins ?? []}
        canEdit={can.edit}
      />
      {view.boards.length === 0 ? (
        <EmptyState title="No boards yet">
          <p>What each board draws stands here once the project has boards.</p>
        </EmptyState>
      ) : (
        <Panel title="What each board draws" note="one unit: at worst, below it as a rule" padding="none">
          <BudgetTable {...{ machine, chosen, addressOf, boards: view.boards, rails: view.rails }} />
        </Panel>
      )}
      <div id="board" className="flex scroll-mt-4 flex-col gap-5">
        {board && (
          <BoardPanel
            key={board.code}
            {...{ project, board, acts }}
            rails={view.rails.map(({ name }) => name)}
            canEdit={can.edit}
          />
        )}
        {board && place && board.windows.length > 0 && (
          <FirstPower
            key={`first ${board.code}`}
            {...{ project, place, windows: board.windows, offer: acts.offer }}
            canEdit={can.editProcedure}
          />
        )}
      </div>
      <ContactsPanel loads={machine?.contacts ?? []} ambientC={view.conditions.ambientC} />
      <DropPanel rails={view.rails} drops={machine?.drops ?? []} copper={view.copper} slots={view.slots} />
    </Page>
  );
}

function ledeOf({ boards, machine }: PowerView): string {
  const known = boards.filter(({ power }) => power !== null).length;
  const of =
    known === 0
      ? "No board has a budget yet."
      : known === boards.length
        ? "Every board has a budget."
        : `${known} of ${boards.length} boards ${known === 1 ? "has" : "have"} a budget.`;
  if (!machine.ok) return of;
  const short = machine.value.margins.filter(({ verdict }) => verdict === "too little").map(({ rail }) => rail);
  const hot = machine.value.contacts.filter(({ verdict }) => verdict !== "fits").length;
  const low = machine.value.drops.filter(({ verdict }) => verdict === "too low").length;
  const troubles = [
    ...(short.length > 0 ? [`${short.join(" and ")} asks too much of its supply`] : []),
    ...(hot > 0 ? [`${hot} of the contact groups carry too much`] : []),
    ...(low > 0 ? [`${low} cards get too little voltage`] : []),
  ];
  return troubles.length === 0 ? of : `${of} ${troubles.join("; ")}.`;
}
