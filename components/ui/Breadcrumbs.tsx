import clsx from "clsx";
import Link from "next/link";
import { Icon } from "./Icon";

/** Without `href` it is the place one is at. */
export type Crumb = { label: string; href?: string };

/** On a phone only the last crumb, and a step back to the one before it. */
export function Breadcrumbs({ crumbs, className }: { crumbs: readonly Crumb[]; className?: string }) {
  const back = crumbs.findLast((crumb, index) => crumb.href && index < crumbs.length - 1);
  return (
    <nav aria-label="Where you are" className={clsx("flex items-center text-[0.9375rem]", className)}>
      {back?.href && (
        <Link
          href={back.href}
          aria-label={`Back to ${back.label}`}
          className="-ml-1.5 flex size-10 shrink-0 items-center justify-center rounded text-ink-soft sm:hidden"
        >
          <Icon name="chevron-left" />
        </Link>
      )}
      <ol className="flex min-w-0 items-center gap-2">
        {crumbs.map((crumb, index) => {
          const isLast = index === crumbs.length - 1;
          return (
            <li
              key={`${index}-${crumb.label}`}
              className={clsx("flex min-w-0 items-center gap-2", !isLast && "max-sm:hidden")}
            >
              {index > 0 && (
                <span aria-hidden="true" className="text-ink-faint max-sm:hidden">
                  /
                </span>
              )}
              {crumb.href ? (
                <Link
                  href={crumb.href}
                  aria-current={isLast ? "page" : undefined}
                  className={clsx(
                    "flex min-h-8 items-center truncate rounded hover:text-copper",
                    isLast ? "font-semibold" : "text-ink-soft",
                  )}
                >
                  {crumb.label}
                </Link>
              ) : (
                <span aria-current={isLast ? "page" : undefined} className="truncate font-semibold">
                  {crumb.label}
                </span>
              )}
            </li>
          );
        })}
      </ol>
    </nav>
  );
}
