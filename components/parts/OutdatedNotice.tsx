import Link from "next/link";
import { DateTime } from "@/components/ui/DateTime";
import { Notice } from "@/components/ui/Notice";

type Outdated = { serial: string; block: { id: string; name: string }; changedAt: string };
type Props = { project: string; zone: string; units: readonly Outdated[] };

/** "SUM-01 was built before Carry cell changed on …": what is on the table is not what the plan says. */
export function OutdatedNotice({ project, zone, units }: Props) {
  if (units.length === 0) return null;
  const blocks = new Map(units.map(({ block, changedAt }) => [block.id, { ...block, changedAt }]));
  return (
    <Notice kind="doubtful" title="Not every unit is as the plan says">
      <ul className="flex flex-col gap-0.5">
        {[...blocks.values()].map(({ id, name, changedAt }) => {
          const serials = units.filter((unit) => unit.block.id === id).map(({ serial }) => serial);
          return (
            <li key={id}>
              {serials.map((serial, index) => (
                <span key={serial}>
                  {index > 0 && (index === serials.length - 1 ? " and " : ", ")}
                  <Link href={`/projects/${project}/units/${encodeURIComponent(serial)}`} className="link mono text-sm">
                    {serial}
                  </Link>
                </span>
              ))}{" "}
              {serials.length === 1 ? "was" : "were"} built before{" "}
              <Link href={`/projects/${project}/parts/blocks/${id}`} className="link">
                {name}
              </Link>{" "}
              changed on <DateTime at={changedAt} zone={zone} form="day" />.
            </li>
          );
        })}
      </ul>
    </Notice>
  );
}
