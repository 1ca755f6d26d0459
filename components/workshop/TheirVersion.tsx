import { Notice } from "@/components/ui/Notice";

/** After a stale edit: what stands on the server now, beside what was typed. */
export function TheirVersion({ rows }: { rows: readonly { name: string; theirs: string; yours: string }[] }) {
  const different = rows.filter((row) => row.theirs !== row.yours);
  return (
    <Notice kind="reopened" title="Somebody saved this meanwhile">
      {different.length === 0 ? (
        <p>Both are the same. Save again to go on.</p>
      ) : (
        <>
          <p>What you typed is still in the form. Save again to put it in place of what is there now:</p>
          <dl className="mt-2 grid grid-cols-[auto_minmax(0,1fr)] gap-x-4 gap-y-1 text-sm">
            {different.map((row) => (
              <div key={row.name} className="contents">
                <dt className="text-ink-soft">{row.name}</dt>
                <dd className="whitespace-pre-wrap">
                  <span className="sr-only">There now: </span>
                  {row.theirs === "" ? "(empty)" : row.theirs}
                </dd>
              </div>
            ))}
          </dl>
        </>
      )}
    </Notice>
  );
}
