import type { Metadata } from "next";
import { TakePlace } from "@/components/wiring/take/TakePlace";
import { definePage } from "@/lib/actions/define-page";
import { loadTakeSources } from "@/lib/pin-map-file/load-take-sources";
import { takePinMaps } from "./actions";

export const metadata: Metadata = { title: "Take a file" };

export default definePage({
  permission: "wiring.edit",
  path: (params) => `/projects/${params.project}/wiring/take`,
  render: async (scope, { search }) => (
    <TakePlace
      {...await loadTakeSources(scope)}
      asked={typeof search.connector === "string" ? search.connector : null}
      project={scope.slug}
      take={takePinMaps}
    />
  ),
});
