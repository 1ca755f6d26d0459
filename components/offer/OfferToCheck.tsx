"use client";

import Link from "next/link";
import { useRouter } from "next/navigation";
import { useState } from "react";
import { Button } from "@/components/ui/Button";
import { Notice } from "@/components/ui/Notice";
import { Select } from "@/components/ui/Select";
import { useSubmit } from "@/components/ui/form/useSubmit";
import type { OfferPlace, OfferTarget } from "@/lib/offer/schema";
import type { OfferAct, OfferInput } from "./offer-acts";
import { OfferChange, type ChangeLine } from "./OfferChange";

const NEW = "new";

export type OfferToCheckProps = {
  project: string;
  place: OfferPlace;
  /** Fields of the kind's form that would change, with their names for people. */
  fields: readonly { field: string; name: string; text: string }[];
  caution: OfferInput["caution"];
  /** Offered besides the checks that are there; null: only those. */
  fresh: Extract<OfferInput["target"], { is: "new" }>["check"] | null;
  canEdit: boolean;
  act: OfferAct;
  /** Which check is chosen to begin with; null: the new one. */
  prefer?: string | null;
  /** What to look at in the chosen check, e.g. an instruction that names another figure. */
  remark?: (target: OfferTarget) => string | undefined;
};

/** A figure that was worked out, offered to one check of the board's draft. Nothing changes before somebody says so. */
export function OfferToCheck({
  project,
  place,
  fields,
  caution,
  fresh,
  prefer,
  canEdit,
  act,
  remark,
}: OfferToCheckProps) {
  const router = useRouter();
  const [chosen, setChosen] = useState((prefer === undefined ? place.checks[0]?.key : prefer) ?? NEW);
  const { submit, isPending, error } = useSubmit(act, { onDone: () => router.refresh() });
  const [taken, setTaken] = useState<string>();
  const target = place.checks.find((check) => check.key === chosen);
  const procedure = `/projects/${project}/boards/${encodeURIComponent(place.board)}/procedure`;
  const options = [
    ...place.checks.map(({ key, title }) => ({ id: key, label: title })),
    ...(fresh ? [{ id: NEW, label: `A new check: ${fresh.title}` }] : []),
  ];
  if (place.draftVersion === null && place.issuedNumber === null) {
    return (
      <p className="text-[0.9375rem] text-ink-soft">
        {place.name} has no procedure yet.{" "}
        <Link href={procedure} className="link">
          Write it first
        </Link>
        ; then this can go into a check.
      </p>
    );
  }
  if (options.length === 0) {
    return (
      <p className="text-[0.9375rem] text-ink-soft">
        No check of {place.name} can take this. Add one to its procedure.
      </p>
    );
  }
  const lines = linesOf(fields, caution, target);
  const isThere = target !== undefined && lines.every(({ now, then }) => now === then);
  const note = target && remark?.(target);

  async function put() {
    const typed = Object.fromEntries(fields.map(({ field, text }) => [field, text]));
    const { board, draftVersion, issuedNumber } = place;
    const to = target
      ? { is: "existing" as const, key: target.key, typed }
      : fresh && { is: "new" as const, check: fresh };
    if (!to) return;
    const write = { project, writeId: crypto.randomUUID(), board, draftVersion, issuedNumber, caution };
    const reply = await submit({ ...write, target: to });
    if (!reply.ok) return;
    setChosen(reply.value.key);
    setTaken(reply.value.begun ? "A draft was begun, and this is in it." : "It is in the draft.");
  }

  return (
    <div className="flex flex-col gap-3">
      {options.length > 1 ? (
        <Select label="Check" value={chosen} onChange={setChosen} options={options} isDisabled={!canEdit} />
      ) : (
        <p className="text-[0.9375rem] font-semibold">{options[0]?.label}</p>
      )}
      <OfferChange lines={lines} />
      {note && <Notice kind="doubtful">{note}</Notice>}
      {error && <Notice kind="error">{error.message}</Notice>}
      <div className="flex flex-wrap items-center gap-x-4 gap-y-2 print:hidden">
        {canEdit && !isThere && (
          <Button isPending={isPending} onPress={() => void put()}>
            Put it into the draft
          </Button>
        )}
        <p role="status" className="min-w-48 flex-1 text-sm text-ink-soft">
          {isThere ? `${taken ?? "The check says so already."} ` : ""}
          <Standing place={place} canEdit={canEdit} isThere={isThere} href={procedure} />
        </p>
      </div>
    </div>
  );
}

type StandingProps = { place: OfferPlace; canEdit: boolean; isThere: boolean; href: string };

/** Where it would go, and when it becomes real. */
function Standing({ place, canEdit, isThere, href }: StandingProps) {
  const hasDraft = place.draftVersion !== null;
  if (!canEdit && !isThere) return "A maintainer can put it into the draft of the procedure.";
  if (isThere && !hasDraft) return `Version ${place.issuedNumber} is issued with it.`;
  if (!hasDraft)
    return `Begins a draft from version ${place.issuedNumber}. No unit sees it before the draft is issued.`;
  return (
    <>
      It becomes real when a maintainer issues{" "}
      <Link href={href} className="link">
        the draft of {place.board}
      </Link>
      .
    </>
  );
}

function linesOf(
  fields: OfferToCheckProps["fields"],
  caution: OfferInput["caution"],
  target: OfferTarget | undefined,
): ChangeLine[] {
  const lines = fields.map(({ field, name, text }) => ({
    name,
    now: target ? (target.typed[field] ?? "") : null,
    then: text,
  }));
  if (!caution) return lines;
  const now = target ? (target.caution.split("\n").find((line) => line.startsWith(caution.begins)) ?? "") : null;
  return [...lines, { name: "Caution", now, then: caution.text, isProse: true }];
}
