import { notFound, redirect } from "next/navigation";
import { connection } from "next/server";
import type { ReactNode } from "react";
import type { Requirement } from "@/lib/access/permissions";
import { currentViewer } from "@/lib/auth/current-viewer";
import { authorise, type ScopeFor } from "./authorise";
import { orDatabaseAway } from "./unexpected";

type Params = Record<string, string>;
type Search = Record<string, string | string[] | undefined>;
export type PageProps = { params: Promise<Params>; searchParams: Promise<Search> };

type Definition<Need extends Requirement> = {
  permission: Need;
  /** Where to go after signing in; defaults to the page itself. */
  render: (scope: ScopeFor<Need>, page: { params: Params; search: Search; path: string }) => Promise<ReactNode>;
  path: (params: Params) => string;
};

/**
 * The one chain of a page: session → permission → loader → render. Signed out goes to sign-in and comes back;
 * what one may not see is not found.
 */
export function definePage<Need extends Requirement>(definition: Definition<Need>) {
  return async function Page(props: PageProps): Promise<ReactNode> {
    await connection();
    const [params, search] = await Promise.all([props.params, props.searchParams]);
    const path = definition.path(params);
    const viewer = await currentViewer();
    const granted = await orDatabaseAway(() => authorise(definition.permission, viewer, params.project));
    if (!granted.ok) {
      if (granted.error.code === "signed-out") redirect(`/sign-in?next=${encodeURIComponent(path)}`);
      notFound();
    }
    // authorise() answers with the scope that this requirement names; the compiler cannot follow the correlation.
    const scope = granted.value as ScopeFor<Need>;
    return orDatabaseAway(() => definition.render(scope, { params, search, path }));
  };
}
