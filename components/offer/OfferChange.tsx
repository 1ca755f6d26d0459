import clsx from "clsx";
import { Icon } from "@/components/ui/Icon";

export type ChangeLine = {
  name: string; /** Null in a check that is not there yet. */
  now: string | null;
  then: string;
  isProse?: boolean;
};

/** What stands in the check now, and what would stand there. Lines that stay the same are said quietly. */
export function OfferChange({ lines }: { lines: readonly ChangeLine[] }) {
  return (
    <dl className="grid grid-cols-[auto_minmax(0,1fr)] gap-x-4 gap-y-1.5 text-[0.9375rem]">
      {lines.map(({ name, now, then, isProse }) => (
        <div key={name} className="contents">
          <dt className="text-ink-soft">{name}</dt>
          <dd className={clsx("flex flex-wrap items-baseline gap-x-2", !isProse && "mono text-sm")}>
            {now !== null && now !== then && (
              <>
                <span className="text-ink-soft">
                  <span className="sr-only">now </span>
                  {now === "" ? "nothing" : now}
                </span>
                <Icon name="chevron-right" size={13} className="self-center text-ink-soft" />
              </>
            )}
            <span className={clsx(now !== then && "font-semibold")}>
              <span className="sr-only">{now === then ? "stays " : now === null ? "" : "then "}</span>
              {then}
            </span>
            {now === then && <span className="font-text text-ink-soft">as it is</span>}
          </dd>
        </div>
      ))}
    </dl>
  );
}
