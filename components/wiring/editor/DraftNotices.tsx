"use client";

import { Button } from "@/components/ui/Button";
import { DateTime } from "@/components/ui/DateTime";
import { Notice } from "@/components/ui/Notice";
import { COLUMN_NAMES, EMPTY_TEXTS, PIN_COLUMNS } from "@/lib/pin-map/pin-columns";
import type { ConnectorDraft, KeptRows } from "../draft/pin-drafts";
import { conflictsOf, strayDrafts, type PinState, type PinStore } from "../draft/pin-store";

type Props = {
  state: PinState;
  store: PinStore;
  nameOf: (connectorId: string) => string;
  zone: string;
  failure: string | undefined;
};

const pinsIn = (draft: ConnectorDraft | undefined) => Object.keys(draft?.pins ?? {}).length;
const counted = (count: number, one: string) => `${count} ${one}${count === 1 ? "" : "s"}`;

/** What happened to things typed and not saved: found again, in conflict, without a home, not kept, not saved. */
export function DraftNotices({ state, store, nameOf, zone, failure }: Props) {
  const conflicts = conflictsOf(state);
  const strays = strayDrafts(state);
  const { restored, isShelved, drafts } = state;
  return (
    <>
      {conflicts.map((id) => (
        <Conflict key={id} id={id} state={state} store={store} name={nameOf(id)} zone={zone} />
      ))}
      {failure && conflicts.length === 0 && <Notice kind="error">{failure}</Notice>}
      {restored > 0 && conflicts.length === 0 && (
        <Notice
          kind="info"
          role="status"
          actions={
            <>
              <Button size="sm" onPress={() => store.forgetRestored()}>
                Go on
              </Button>
              <Button size="sm" kind="quiet" onPress={() => store.discard()}>
                Throw them away
              </Button>
            </>
          }
        >
          {counted(restored, "pin")} that you changed here before and did not save {restored === 1 ? "is" : "are"} still
          there, kept on this device.
        </Notice>
      )}
      {strays.map((id) => (
        <Notice
          key={id}
          kind="caution"
          actions={
            <Button size="sm" onPress={() => store.takeTheirs(id)}>
              Throw them away
            </Button>
          }
        >
          {counted(pinsIn(drafts[id]), "pin")} that you changed belonged to a connector that somebody removed meanwhile:{" "}
          {Object.keys(drafts[id]?.pins ?? {}).join(", ")}.
        </Notice>
      ))}
      {!isShelved && (
        <Notice kind="caution" role="status">
          This device does not keep what you type. Save before you leave the page.
        </Notice>
      )}
    </>
  );
}

type ConflictProps = { id: string; state: PinState; store: PinStore; name: string; zone: string };

/** Two people changed one connector: nothing is merged behind anybody's back. */
function Conflict({ id, state, store, name, zone }: ConflictProps) {
  const draft = state.drafts[id];
  const now = state.kept[id];
  if (!draft || !now) return null;
  const { by = "Somebody", at = null } = state.theirs[id] ?? {};
  const both = clashes(draft, now);
  const mine = pinsIn(draft);
  return (
    <Notice
      kind="error"
      title={`${by} saved ${name} while you were typing.`}
      actions={
        <>
          <Button size="sm" onPress={() => store.goOnWithMine(id)}>
            Lay mine over theirs
          </Button>
          <Button size="sm" onPress={() => store.takeTheirs(id)}>
            Take theirs, drop my {counted(mine, "pin")}
          </Button>
        </>
      }
    >
      <p>
        {at !== null && (
          <>
            <DateTime at={at} zone={zone} />.{" "}
          </>
        )}
        The table shows their version with your {counted(mine, "changed pin")} over it; nothing is saved yet.{" "}
        {both.length === 0 ? "None of your cells was changed by them, too." : "You both changed:"}
      </p>
      {both.length > 0 && (
        <table className="mt-2 w-full max-w-2xl text-sm">
          <thead className="text-left text-ink-soft">
            <tr>
              {["Pin", "Column", "Before", "Theirs", "Yours"].map((heading) => (
                <th key={heading} scope="col" className="pr-4 font-semibold">
                  {heading}
                </th>
              ))}
            </tr>
          </thead>
          <tbody className="mono">
            {both.map(({ key, cells }) => (
              <tr key={key}>
                {cells.map((cell, index) => (
                  <td key={index} className="pr-4 align-top">
                    {cell === "" ? "–" : cell}
                  </td>
                ))}
              </tr>
            ))}
          </tbody>
        </table>
      )}
    </Notice>
  );
}

function clashes(draft: ConnectorDraft, now: KeptRows) {
  return Object.entries(draft.pins).flatMap(([pin, { typed, was }]) => {
    const theirs = now.rows[pin] ?? EMPTY_TEXTS;
    return PIN_COLUMNS.filter((column) => typed[column] !== undefined && theirs[column] !== was[column]).map(
      (column) => ({
        key: `${pin} ${column}`,
        cells: [pin, COLUMN_NAMES[column], was[column], theirs[column], typed[column] ?? ""],
      }),
    );
  });
}
