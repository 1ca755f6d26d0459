import type { Metadata } from "next";
import { SearchPlace } from "@/components/search/SearchPlace";
import { definePage } from "@/lib/actions/define-page";
import { searchInput } from "@/lib/search/schema";
import { searchProjectWhole } from "@/lib/search/search-project";

export const metadata: Metadata = { title: "Search" };

export default definePage({
  permission: "project.see",
  path: (params) => `/projects/${params.project}/search`,
  render: async (scope, { search }) => {
    const asked = searchInput.safeParse({ project: scope.slug, q: typeof search.q === "string" ? search.q : "" });
    const input = asked.success ? asked.data : { project: scope.slug, q: "" };
    const answer = await searchProjectWhole(scope, input);
    return (
      <SearchPlace
        project={scope.slug}
        answer={answer.ok ? answer.value : { q: input.q, hits: [], cut: false }}
        problem={asked.success ? undefined : asked.error.issues[0]?.message}
      />
    );
  },
});
