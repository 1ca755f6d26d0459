"use client";

import { Notice } from "@/components/ui/Notice";
import { Panel } from "@/components/ui/Panel";
import { Disclosure } from "@/components/workshop/Disclosure";
import { formatDuration } from "@/lib/calc/units";
import { stageName } from "@/lib/procedure/stages";
import type { DoubtPreview } from "@/lib/rework/doubt-view";
import { DoubtfulChecks } from "./DoubtfulChecks";
import { DoubtLines } from "./DoubtLines";
import type { Choice } from "./rework-draft";
import { SparedChecks } from "./SparedChecks";
import { UntouchedChecks } from "./UntouchedChecks";

type Props = {
  serial: string;
  zone: string;
  preview: DoubtPreview | undefined;
  /** Whether the list belongs to what stands in the form now. */
  isFresh: boolean;
  /** Whether anything is said that could be touched. */
  isWorth: boolean;
  failure: string | undefined;
  added: readonly Choice[];
  spared: readonly Choice[];
  onAdded: (list: Choice[]) => void;
  onSpared: (list: Choice[]) => void;
  /** When it was done; checks that were carried out after that are pointed at. */
  performedAt: string;
};

/** Which checks the rework puts in doubt, each with its reason, before it is saved. */
export function DoubtList(props: Props) {
  const { serial, preview, isFresh, isWorth, failure } = props;
  if (!isWorth) {
    return (
      <Panel title="What comes into doubt">
        <p className="text-ink-soft">
          Say what the rework touches. The checks that must be repeated stand here before anything is saved, each with
          its reason.
        </p>
      </Panel>
    );
  }
  return (
    <Panel title="What comes into doubt" note={isFresh ? undefined : "looking …"}>
      <div className="grid gap-4" aria-live="polite" aria-busy={!isFresh}>
        {failure && <Notice kind="error">{failure}</Notice>}
        {preview && (
          <>
            <Repeat preview={preview} />
            {preview.remarks.map((remark) => (
              <Notice key={remark} kind="caution" role="note">
                {remark}
              </Notice>
            ))}
            <DoubtfulChecks {...props} lines={preview.doubtful} />
            <SparedChecks {...props} lines={[...preview.doubtful, ...preview.spared]} />
            {preview.open.length > 0 && (
              <Disclosure summary={`${preview.open.length} touched, with no pass to doubt`}>
                <DoubtLines lines={preview.open} serial={serial} />
              </Disclosure>
            )}
            {preview.untouched.length > 0 && (
              <Disclosure
                summary={`${preview.untouched.length} ${preview.untouched.length === 1 ? "stays" : "stay"} as ${preview.untouched.length === 1 ? "it is" : "they are"}`}
              >
                <UntouchedChecks {...props} lines={preview.untouched} />
              </Disclosure>
            )}
            {preview.untouchedElsewhere > 0 && (
              <p className="text-ink-soft text-sm">
                {preview.untouchedElsewhere} more on other units of the machine are not touched.
              </p>
            )}
          </>
        )}
      </div>
    </Panel>
  );
}

function Repeat({ preview: { repeat } }: { preview: DoubtPreview }) {
  return (
    <div>
      <p className="text-lg font-semibold">{repeat.sentence}</p>
      {repeat.stages.length > 0 && (
        <p className="text-ink-soft text-sm">
          {repeat.stages
            .map(
              ({ stage, checks, seconds }) =>
                `${stageName(stage)} ${checks}${seconds === null ? "" : `, ${formatDuration(seconds)}`}`,
            )
            .join(" · ")}
        </p>
      )}
    </div>
  );
}
