"use client";

import { useAct } from "@/components/board/use-act";
import { Button } from "@/components/ui/Button";
import { ConfirmDialog } from "@/components/ui/ConfirmDialog";
import { counted } from "@/components/workshop/counted";
import type { FamilyLine } from "@/lib/family/load-families";
import { isOwn, type FamilyActs } from "./family-acts";
import { FamilyDialog } from "./FamilyDialog";

type Props = { line: FamilyLine; project: string; acts: FamilyActs };

export function FamilyRowActs({ line, project, acts }: Props) {
  const { family, replacedBy } = line;
  if (isOwn(line)) {
    return (
      <span className="inline-flex gap-1">
        <FamilyDialog
          line={line}
          project={project}
          save={acts.save}
          trigger={
            <Button size="sm" kind="quiet" aria-label={`Change ${family.name}`}>
              Change
            </Button>
          }
        />
        <RemoveFamilyButton line={line} project={project} acts={acts} />
      </span>
    );
  }
  if (replacedBy !== null) return null;
  return (
    <FamilyDialog
      from={family}
      project={project}
      save={acts.save}
      trigger={
        <Button size="sm" kind="quiet" aria-label={`Enter your data sheet of ${family.name}`}>
          Enter your data sheet
        </Button>
      }
    />
  );
}

function RemoveFamilyButton({ line, project, acts }: Props & { line: FamilyLine & { id: string } }) {
  const { act } = useAct();
  const { id: familyId, version, replaces, pins, family } = line;
  return (
    <ConfirmDialog
      title={`Remove your figures of ${family.name}?`}
      trigger={
        <Button size="sm" kind="quiet" aria-label={`Remove ${family.name}`}>
          Remove
        </Button>
      }
      consequences={[
        replaces
          ? `The built-in ${replaces} takes its place again${pins > 0 ? ` for ${counted(pins, "pin")}` : ""}.`
          : pins > 0
            ? `${counted(pins, "pin")} that ${pins === 1 ? "names" : "name"} it are of an unknown family; their levels are not looked at.`
            : "No pin names it.",
        "The wiring is checked again; findings that were accepted with these figures may open.",
      ]}
      confirmLabel={`Remove the figures of ${family.name}`}
      onConfirm={() =>
        act(
          () => acts.remove({ project, writeId: crypto.randomUUID(), familyId, version }),
          ({ name }) => `Your figures of ${name} are gone.`,
        )
      }
    />
  );
}
