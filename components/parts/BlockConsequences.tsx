import { Notice } from "@/components/ui/Notice";
import { counted } from "@/components/workshop/counted";
import type { BlockView } from "@/lib/block/load-block";

/** Stands above the button while the contents differ from what is saved: whom the change concerns. */
export function BlockConsequences({ view }: { view: BlockView }) {
  const { uses } = view;
  if (uses.length === 0) return null;
  const units = uses.flatMap((use) => use.units);
  return (
    <Notice kind="doubtful" role="status" title={`Saving this changes ${counted(uses.length, "board")}`}>
      <ul>
        {uses.map(({ code, name, count, through }) => (
          <li key={code}>
            <span className="mono text-sm font-semibold">{code}</span> {name} has {counted(count, "of it", "of them")}
            {through.length > 0 && `, through ${through.join(" and ")}`}.
          </li>
        ))}
      </ul>
      <p className="mt-1">
        {units.length === 0 ? (
          "No unit of them is built yet."
        ) : (
          <>
            It no longer describes <span className="mono text-sm">{units.join(", ")}</span>, built before. Their boards
            will say so.
          </>
        )}
      </p>
    </Notice>
  );
}
