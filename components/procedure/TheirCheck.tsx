import { TheirVersion } from "@/components/workshop/TheirVersion";
import { Notice } from "@/components/ui/Notice";
import { checkKind } from "@/lib/check-kinds/list";
import type { CheckRow } from "@/lib/procedure/check-row";
import { draftOf, type CheckDraft } from "./check-draft";

/** The check as somebody else left it, beside what is in the form. */
export function TheirCheck({ theirs, yours }: { theirs: CheckRow | undefined; yours: CheckDraft }) {
  if (!theirs) {
    return (
      <Notice kind="reopened">Somebody deleted this check meanwhile. Saving it brings it back as you have it.</Notice>
    );
  }
  const there = draftOf(theirs);
  const yes = (flag: boolean) => (flag ? "yes" : "no");
  const kind = checkKind(yours.kind);
  const typed = kind.readTyped(yours.typed);
  return (
    <TheirVersion
      rows={[
        { name: "Stage", theirs: there.stage, yours: yours.stage },
        { name: "Title", theirs: there.title, yours: yours.title },
        { name: "Instruction", theirs: there.instruction, yours: yours.instruction },
        { name: "Caution", theirs: there.caution, yours: yours.caution },
        { name: "Kind", theirs: checkKind(there.kind).label, yours: kind.label },
        {
          name: "Expectation",
          theirs: checkKind(theirs.kind).expectation(theirs.spec),
          yours: typed.ok ? kind.expectation(typed.value) : "",
        },
        { name: "Hold point", theirs: yes(there.holdPoint), yours: yes(yours.holdPoint) },
        { name: "Signals", theirs: there.signals, yours: yours.signals },
        { name: "Pins", theirs: there.pins, yours: yours.pins },
        { name: "Rails", theirs: there.rails, yours: yours.rails },
        { name: "Reference", theirs: there.reference, yours: yours.reference },
      ]}
    />
  );
}
