import clsx from "clsx";

/** The outline of what is on its way, hatched like an area kept free on a drawing. */
export function Skeleton({ className, label }: { className?: string; label?: string }) {
  return (
    <div className={clsx("hatch motion-wait rounded border border-rule", className ?? "h-5 w-full")}>
      {label && (
        <span role="status" className="sr-only">
          {label}
        </span>
      )}
    </div>
  );
}
