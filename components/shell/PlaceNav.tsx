"use client";

import clsx from "clsx";
import Link from "next/link";
import { Button } from "react-aria-components";
import { Count } from "../ui/Count";
import { tabLook } from "../ui/tab-style";
import { Drawer } from "../ui/Drawer";
import { PlaceMark, type PlaceMarkName } from "./PlaceMark";

export type Place = {
  href: string;
  label: string;
  mark: PlaceMarkName;
  isCurrent: boolean;
  count?: number;
  /** What is counted, for a screen reader: "open". */
  countLabel?: string;
  /** One of the few in the bar under the thumb; the rest are behind "More". */
  underThumb?: boolean;
};

/** The places of a project: a line under the header, on a phone a bar under the thumb. */
export function PlaceNav({ places }: { places: readonly Place[] }) {
  return (
    <>
      <nav
        aria-label="Places"
        data-chrome
        className="-mx-2 flex gap-1 overflow-x-auto max-sm:hidden [scrollbar-width:none]"
      >
        {places.map((place) => (
          <Link
            key={place.href}
            href={place.href}
            aria-current={place.isCurrent ? "page" : undefined}
            className={clsx(tabLook(place.isCurrent), "mb-0! min-h-11 px-2.5")}
          >
            {place.label}
            <PlaceCount place={place} />
          </Link>
        ))}
      </nav>
      <PhoneBar places={places} />
    </>
  );
}

function PlaceCount({ place }: { place: Place }) {
  if (place.count === undefined) return null;
  return <Count value={place.count} tone="failed" {...(place.countLabel ? { label: place.countLabel } : {})} />;
}

function PhoneBar({ places }: { places: readonly Place[] }) {
  const first = places.filter((place) => place.underThumb);
  const rest = places.filter((place) => !place.underThumb);
  const isElsewhere = rest.some((place) => place.isCurrent);
  return (
    <nav
      aria-label="Places, short"
      data-chrome
      className="fixed inset-x-0 bottom-0 z-30 flex border-t border-rule bg-sheet pb-[env(safe-area-inset-bottom)] sm:hidden"
    >
      {first.map((place) => (
        <Link
          key={place.href}
          href={place.href}
          aria-current={place.isCurrent ? "page" : undefined}
          className={bar(place.isCurrent)}
        >
          <PlaceMark name={place.mark} />
          <span className="flex items-baseline gap-1">
            {place.label}
            <PlaceCount place={place} />
          </span>
        </Link>
      ))}
      {rest.length > 0 && (
        <Drawer
          title="More places"
          from="below"
          trigger={
            <Button className={bar(isElsewhere)}>
              <PlaceMark name="more" />
              More
            </Button>
          }
        >
          {(close) => (
            <ul className="-mx-2 flex flex-col">
              {rest.map((place) => (
                <li key={place.href}>
                  <Link
                    href={place.href}
                    onClick={close}
                    aria-current={place.isCurrent ? "page" : undefined}
                    className={clsx(
                      "flex min-h-14 items-center gap-3.5 rounded px-2 text-lg",
                      place.isCurrent && "font-semibold text-copper",
                    )}
                  >
                    <PlaceMark name={place.mark} />
                    {place.label}
                    <PlaceCount place={place} />
                  </Link>
                </li>
              ))}
            </ul>
          )}
        </Drawer>
      )}
    </nav>
  );
}

const bar = (isCurrent: boolean) =>
  clsx(
    "relative flex min-h-15 flex-1 flex-col items-center justify-center gap-1 text-xs outline-offset-[-3px] before:absolute before:inset-x-3 before:top-0 before:h-[3px]",
    isCurrent ? "font-semibold text-ink before:bg-copper" : "text-ink-soft",
  );
