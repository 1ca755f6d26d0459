import type { Metadata } from "next";
import { ButtonLink } from "@/components/ui/ButtonLink";
import { StandAlone } from "@/components/shell/StandAlone";

export const metadata: Metadata = { title: "Not found" };

export default function NotFound() {
  return (
    <StandAlone state="untested" code="404" title="Nothing is fitted here">
      <p>
        The page is not there, or it belongs to a project that you have no part in. A link in an old e-mail may name
        something that was removed since.
      </p>
      <div className="mt-5 flex flex-wrap gap-2">
        <ButtonLink kind="primary" href="/projects">
          Go to the projects
        </ButtonLink>
        <ButtonLink href="/">Go to the start</ButtonLink>
      </div>
    </StandAlone>
  );
}
