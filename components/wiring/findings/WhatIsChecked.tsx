import { Panel } from "@/components/ui/Panel";
import { Disclosure } from "@/components/workshop/Disclosure";
import { WEIGHT_WORDS, WeightMark } from "../WeightMark";
import { RULE_FAMILIES } from "./rules-explained";

const MEANS = {
  must: "Boards will be damaged, or will not work.",
  should: "It may work, but not surely.",
  look: "Often intended; somebody should know.",
} as const;

/** Which rules run, which practice each follows, and what it leaves out. */
export function WhatIsChecked() {
  return (
    <Panel title="What is checked">
      <p className="text-[0.9375rem] text-ink-soft">
        The machine as it is put together, every board in its slot, with each change of a pin, a signal, a family or a
        slot. A planning aid, never a proof of safety.
      </p>
      <ul aria-label="How much a finding weighs" className="mt-3 flex flex-col gap-2 text-sm">
        {(["must", "should", "look"] as const).map((weight) => (
          <li key={weight} className="flex gap-2.5">
            <WeightMark weight={weight} className="mt-0.5" />
            <span>
              <b className="block font-semibold">{WEIGHT_WORDS[weight]}</b>
              <span className="text-ink-soft">{MEANS[weight]}</span>
            </span>
          </li>
        ))}
      </ul>
      <ul className="mt-3 border-t border-rule pt-1">
        {RULE_FAMILIES.map(({ name, looksAt, follows, leavesOut }) => (
          <li key={name}>
            <Disclosure summary={name}>
              <dl className="-mt-2 mb-2 flex flex-col gap-1.5 pl-[1.375rem] text-sm">
                <Line name="Looks at" text={looksAt} />
                <Line name="Follows" text={follows} />
                <Line name="Leaves out" text={leavesOut} />
              </dl>
            </Disclosure>
          </li>
        ))}
      </ul>
    </Panel>
  );
}

function Line({ name, text }: { name: string; text: string }) {
  return (
    <div>
      <dt className="inline font-semibold">{name}: </dt>
      <dd className="inline text-ink-soft">{text}</dd>
    </div>
  );
}
