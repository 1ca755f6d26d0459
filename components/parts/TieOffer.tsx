"use client";

import Link from "next/link";
import { useRouter } from "next/navigation";
import type { OfferAct } from "@/components/offer/offer-acts";
import { Button } from "@/components/ui/Button";
import { Notice } from "@/components/ui/Notice";
import { useSubmit } from "@/components/ui/form/useSubmit";
import type { BoardPlanView } from "@/lib/board-plan/load-board-plan";
import { TIE_CHECK_TITLE, tieCheck } from "@/lib/board-plan/tie-check";
import type { SpareGate } from "@/lib/calc/packing";

type Props = {
  project: string;
  view: BoardPlanView;
  spares: readonly SpareGate[];
  canEdit: boolean;
  act: OfferAct;
};

/** Puts the ties into an inspection check of the board's draft, or brings the one that is there up to date. */
export function TieOffer({ project, view, spares, canEdit, act }: Props) {
  const router = useRouter();
  const { submit, isPending, error } = useSubmit(act, { onDone: () => router.refresh() });
  const { board, place } = view;
  const procedure = `/projects/${project}/boards/${encodeURIComponent(board.code)}/procedure`;
  const link = (text: string) => (
    <Link href={procedure} className="link">
      {text}
    </Link>
  );
  const check = tieCheck(board.code, spares);
  const there = place?.checks.find(({ title }) => title === TIE_CHECK_TITLE);
  const isSame = there?.instruction === check.instruction && there.typed.expects === check.typed.expects;
  const issued = place?.issuedNumber ?? null;
  const isDraft = (place?.draftVersion ?? null) !== null;

  if (there && isSame) {
    return (
      <p role="status" className="text-sm text-ink-soft">
        “{TIE_CHECK_TITLE}” lists these ties{" "}
        {isDraft ? (
          <>in {link(`the draft of ${board.code}`)}; it becomes real when that is issued.</>
        ) : (
          <>in {link(`the procedure of ${board.code}`)}.</>
        )}
      </p>
    );
  }
  if (!canEdit) {
    return <p className="text-sm text-ink-soft">A maintainer can make an inspection check of these ties.</p>;
  }

  const put = () =>
    submit({
      project,
      writeId: crypto.randomUUID(),
      board: board.code,
      draftVersion: place?.draftVersion ?? null,
      issuedNumber: place?.issuedNumber ?? null,
      target: there
        ? { is: "existing", key: there.key, typed: check.typed, instruction: check.instruction }
        : { is: "new", check },
      caution: null,
    });
  return (
    <div className="flex flex-col items-start gap-2">
      {there && (
        <p className="text-sm text-ink-soft">
          “{TIE_CHECK_TITLE}” of {link("the procedure")} lists other gates than these.
        </p>
      )}
      <Button isPending={isPending} onPress={() => void put()}>
        {there ? "Bring the inspection check up to date" : "Make these ties an inspection check"}
      </Button>
      <p className="text-sm text-ink-soft">
        {isDraft ? (
          <>It goes into {link(`the draft of ${board.code}`)}.</>
        ) : issued !== null ? (
          `Begins a draft from version ${issued} and puts it there.`
        ) : (
          "Begins a draft of the procedure and puts it there."
        )}{" "}
        No unit sees it before the draft is issued.
      </p>
      {error && <Notice kind="error">{error.message}</Notice>}
    </div>
  );
}
