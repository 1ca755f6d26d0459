import { counted } from "@/components/workshop/counted";
import { Disclosure } from "@/components/workshop/Disclosure";
import type { CheckView } from "@/lib/traveler/traveler-view";
import { CheckRow } from "./CheckRow";
import type { TravelerFrame } from "./traveler-acts";

type Props = {
  checks: readonly CheckView[];
  openId: string | undefined;
  onOpen: (id: string) => void;
  frame: TravelerFrame;
};

/** Checks of earlier versions of the procedure, out of use but not out of the record. */
export function RetiredChecks({ checks, openId, onOpen, frame }: Props) {
  if (checks.length === 0) return null;
  return (
    <div className="mt-4">
      <Disclosure
        summary={`${counted(checks.length, "check")} of earlier procedure versions`}
        isOpen={checks.some((check) => check.id === openId)}
      >
        <ul className="border-rule bg-sheet rounded-lg border">
          {checks.map((check) => (
            <CheckRow
              key={check.id}
              check={check}
              isOpen={check.id === openId}
              onOpen={onOpen}
              zone={frame.zone}
              rule={frame.rule}
            />
          ))}
        </ul>
      </Disclosure>
    </div>
  );
}
