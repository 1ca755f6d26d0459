import { Panel } from "@/components/ui/Panel";
import { formatDuration } from "@/lib/calc/units";
import type { TonightView } from "@/lib/order/tonight-view";
import { CheckLine } from "./CheckLine";

type Props = { plan: NonNullable<TonightView["plan"]>; project: string };

/** What each builder does, in order, with when it begins. */
export function PlanLists({ plan: { lists, sentence }, project }: Props) {
  const isEmpty = lists.every((list) => list.length === 0);
  if (isEmpty) return <p className="text-[0.9375rem] text-ink-soft">{sentence}</p>;
  return (
    <>
      <p className="text-[0.9375rem] text-ink-soft">{sentence}</p>
      <div className={lists.length > 1 ? "grid items-start gap-4 xl:grid-cols-2" : "grid gap-4"}>
        {lists.map((list, index) => (
          <Panel
            key={index}
            title={lists.length > 1 ? `Builder ${index + 1}` : "The plan"}
            note={list.length === 0 ? "" : `until ${clock(list.at(-1)?.endS ?? 0)}`}
            padding="none"
          >
            {list.length === 0 ? (
              <p className="px-4 pb-4 text-[0.9375rem] text-ink-soft sm:px-5">
                Nothing that could be done beside the other.
              </p>
            ) : (
              <ol>
                {list.map((line) => (
                  <li key={line.checkId} className="border-t border-rule">
                    <CheckLine
                      check={line}
                      project={project}
                      reason={line.reason}
                      before={clock(line.startS)}
                      after={formatDuration(line.endS - line.startS)}
                    />
                  </li>
                ))}
              </ol>
            )}
          </Panel>
        ))}
      </div>
    </>
  );
}

/** "0:05", "1:30": from the beginning of the evening. */
function clock(seconds: number): string {
  const minutes = Math.round(seconds / 60);
  return `${Math.floor(minutes / 60)}:${String(minutes % 60).padStart(2, "0")}`;
}
