import Link from "next/link";
import { Page } from "@/components/shell/Page";
import { Button } from "@/components/ui/Button";
import { inputBox } from "@/components/ui/field-style";
import { Panel } from "@/components/ui/Panel";
import type { SearchAnswer } from "@/lib/search/schema";
import { groupHits, HitLine } from "./HitList";

/** Results with an address of their own; works without any script. */
export function SearchPlace({
  project,
  answer,
  problem,
}: {
  project: string;
  answer: SearchAnswer;
  problem: string | undefined;
}) {
  const groups = groupHits(answer.hits);
  return (
    <Page title="Search" width="prose">
      <form action={`/projects/${project}/search`} role="search" className="mb-6 flex gap-2">
        <input
          type="search"
          name="q"
          defaultValue={answer.q}
          aria-label="Boards, units, checks, signals, log"
          placeholder="Boards, units, checks, signals, log"
          maxLength={200}
          className={inputBox}
        />
        <Button type="submit" kind="primary">
          Search
        </Button>
      </form>
      {problem && <p className="text-failed">{problem}</p>}
      {answer.q !== "" && groups.length === 0 && !problem && (
        <p className="text-ink-soft">Nothing in this project matches “{answer.q}”.</p>
      )}
      <div className="flex flex-col gap-4">
        {groups.map((group) => (
          <Panel key={group.kind} title={group.heading} note={String(group.hits.length)}>
            <ul className="-mx-2 flex flex-col">
              {group.hits.map((hit) => (
                <li key={hit.id}>
                  <Link href={hit.href} className="block rounded-md px-2 py-1.5 no-underline hover:bg-raised">
                    <HitLine hit={hit} />
                  </Link>
                </li>
              ))}
            </ul>
          </Panel>
        ))}
        {answer.cut && (
          <p className="text-sm text-ink-soft">The first 50 of each kind are shown. Add a word to narrow it down.</p>
        )}
      </div>
    </Page>
  );
}
