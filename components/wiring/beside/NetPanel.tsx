"use client";

import Link from "next/link";
import type { ComponentProps } from "react";
import { netAddress } from "../pin-address";
import { NetFacts } from "./NetFacts";

type Props = ComponentProps<typeof NetFacts> & {
  project: string;
  /** "CON a10" */
  pin: string;
};

/** The net of the pin one is at. */
export function NetPanel({ project, pin, ...facts }: Props) {
  const { net } = facts;
  const others = (net?.pins.length ?? 1) - 1;
  const boards = net?.placements.length ?? 0;
  const company =
    others === 0
      ? "alone"
      : `and ${others} more ${others === 1 ? "pin" : "pins"} on ${boards} ${boards === 1 ? "board" : "boards"}`;
  return (
    <section
      aria-label="The net of this pin"
      className="rounded-lg border border-rule bg-sheet px-4 py-3.5 max-sm:hidden sm:px-5"
    >
      <div className="mb-2 flex flex-wrap items-baseline gap-x-3 gap-y-1">
        <h2 className="text-lg">
          {net && net.name !== "" ? (
            <Link href={netAddress(project, net.id)} className="mono link text-[0.9375em]">
              {net.name}
            </Link>
          ) : (
            <span className="mono text-[0.9375em]">{pin}</span>
          )}
        </h2>
        <p className="text-sm text-ink-soft">{net ? `${pin} ${company}` : `${pin} is on no net.`}</p>
      </div>
      <NetFacts {...facts} />
    </section>
  );
}
