import type { ReworkKind } from "@/db/schema/faults";
import type { ReworkForm } from "@/lib/rework/load-rework-form";
import type { Touches } from "@/lib/rework/schema";

export type Choice = { checkId: string; reason: string };
type WireDraft = { number: string; from: string; to: string; colour: string; out: boolean };

/** The form as it is typed. The wire stays when another kind is tried, and goes along only with a bodge wire. */
export type ReworkDraft = {
  kind: ReworkKind;
  what: string;
  why: string;
  wire: WireDraft;
  touches: Touches;
  faultId: string;
  /** As the device's clock writes it: "2026-02-03T19:40"; empty is now. */
  performedAt: string;
  added: Choice[];
  spared: Choice[];
};

export function freshRework({ start, nextWire }: ReworkForm): ReworkDraft {
  const { kind, what, why, touches, faultId } = start;
  return {
    ...{ kind, what, why, touches },
    // On another unit the same wire may have another number.
    wire: { from: "", to: "", colour: "", out: false, ...start.wire, number: nextWire },
    faultId: faultId ?? "",
    performedAt: "",
    added: [],
    spared: [],
  };
}

export const wireOf = ({ kind, wire }: ReworkDraft) => (kind === "bodge-wire" ? wire : null);

/** What the preview depends on; two drafts with the same text put the same checks in doubt. */
export function doubtInput(draft: ReworkDraft) {
  const wire = wireOf(draft);
  const { kind, touches, added, spared } = draft;
  return { kind, wire: wire && { from: wire.from, to: wire.to }, touches, added, spared };
}

export const saysSomething = (draft: ReworkDraft): boolean => {
  const wire = wireOf(draft);
  return (
    Object.values(draft.touches).some((names) => names.length > 0) ||
    (wire !== null && (wire.from.trim() !== "" || wire.to.trim() !== ""))
  );
};
