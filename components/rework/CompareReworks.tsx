"use client";

import Link from "next/link";
import { useRouter } from "next/navigation";
import { Panel } from "@/components/ui/Panel";
import { Select } from "@/components/ui/Select";
import type { ComparedRework } from "@/lib/rework/compare-reworks";
import type { ReworkComparison, ReworksView } from "@/lib/rework/load-reworks";
import { nameRework, wireWords } from "@/lib/rework/rework-words";

type Props = {
  project: string;
  serial: string;
  others: ReworksView["others"];
  comparison: ReworkComparison | undefined;
};

/** Which rework which of two units has. */
export function CompareReworks({ project, serial, others, comparison }: Props) {
  const router = useRouter();
  const self = `/projects/${project}/units/${encodeURIComponent(serial)}/reworks`;
  return (
    <Panel title="Compare with" level={3}>
      <div className="grid gap-3">
        <Select
          label="Another unit of the board"
          isLabelHidden
          placeholder="Choose a unit"
          options={others.map(({ serial: id, sameRevision, reworks }) => ({
            id,
            label: id,
            description: `${reworks} ${reworks === 1 ? "rework" : "reworks"}${sameRevision ? "" : ", another revision"}`,
          }))}
          value={comparison?.other.serial ?? null}
          onChange={(id) => router.replace(`${self}?with=${encodeURIComponent(id)}`, { scroll: false })}
        />
        {comparison && <Pairs {...{ project, serial, comparison }} />}
      </div>
    </Panel>
  );
}

function Pairs({ project, serial, comparison }: { project: string; serial: string; comparison: ReworkComparison }) {
  const { other, pairs } = comparison;
  const groups = [
    { title: "Both", pairs: pairs.filter(({ here, there }) => here && there) },
    { title: `Only ${serial}`, pairs: pairs.filter(({ there }) => !there) },
    { title: `Only ${other.serial}`, pairs: pairs.filter(({ here }) => !here) },
  ].filter((group) => group.pairs.length > 0);
  if (groups.length === 0) return <p className="text-ink-soft text-sm">Neither was reworked.</p>;
  const at = (unit: string, { number }: ComparedRework) => (
    <Link
      href={`/projects/${project}/units/${encodeURIComponent(unit)}/reworks#R${number}`}
      className="link mono text-xs"
      prefetch={false}
    >
      R{number}
    </Link>
  );
  return (
    <>
      {groups.map(({ title, pairs: own }) => (
        <section key={title}>
          <h4 className="text-sm font-semibold">
            {title} <span className="text-ink-soft font-normal">{own.length}</span>
          </h4>
          <ul className="mt-1 grid gap-1.5 text-sm">
            {own.map(({ here, there }) => {
              const shown = here ?? there;
              return (
                shown && (
                  <li key={`${here?.id} ${there?.id}`}>
                    <p>
                      {nameRework(shown)} {here && at(serial, here)}
                      {here && there && <span className="text-ink-soft"> and </span>}
                      {there && at(other.serial, there)}
                    </p>
                    <p className="text-ink-soft">{shown.wire ? wireWords(shown.wire) : shown.what}</p>
                  </li>
                )
              );
            })}
          </ul>
        </section>
      ))}
    </>
  );
}
