import { z } from "zod";
import { database } from "@/db/client";
import { findOfferPlaces } from "@/db/queries/offer-places";
import type { Stage } from "@/db/schema/procedures";
import type { ProjectScope } from "@/lib/access/scope";
import { checkKind, type CheckKindName } from "@/lib/check-kinds/list";
import type { OfferPlace } from "./schema";

type Wanted = {
  /** Without it, checks of every stage. */
  stage?: Stage;
  kind: CheckKindName;
  /** Only checks whose form says so: { unit: "A" }. */
  typed?: Record<string, string>;
  /** Code of one board; without it all boards in work. */
  board?: string;
};

/** Where an offer may go: per board its draft, else its newest issued version, with the checks that suit. One query. */
export async function loadOfferPlaces(scope: ProjectScope, wanted: Wanted): Promise<OfferPlace[]> {
  const rows = await findOfferPlaces(database(), scope, wanted);
  const places = new Map<string, OfferPlace>();
  for (const { board, name, number, state, version, check } of rows) {
    const place = places.get(board) ?? {
      board,
      name,
      draftVersion: state === "draft" ? version : null,
      issuedNumber: state === "issued" ? number : null,
      checks: [],
    };
    places.set(board, place);
    if (!check) continue;
    const typed = textOf(checkKind(check.kind).typedFromSpec(check.spec));
    const suits = Object.entries(wanted.typed ?? {}).every(([field, text]) => typed[field] === text);
    const { key, title, instruction, caution } = check;
    if (suits) place.checks.push({ key, title, typed, instruction, caution });
  }
  return [...places.values()];
}

const formShape = z.record(z.string(), z.unknown());

function textOf(typed: unknown): Record<string, string> {
  const fields = Object.entries(formShape.parse(typed));
  return Object.fromEntries(fields.flatMap(([field, value]) => (typeof value === "string" ? [[field, value]] : [])));
}
