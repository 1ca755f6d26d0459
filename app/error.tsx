"use client";

import { StandAlone } from "@/components/shell/StandAlone";
import { Button } from "@/components/ui/Button";
import { ButtonLink } from "@/components/ui/ButtonLink";
import { errorNumber } from "@/components/shell/error-number";

export default function ErrorPage({ error, retry }: { error: unknown; retry: () => void }) {
  const number = errorNumber(error);
  return (
    <StandAlone state="failed" code="500" title="This page did not come up">
      <p>
        Something went wrong on our side. What was recorded before is kept; attempts held on this device go out when it
        works again.
      </p>
      {number && (
        <p className="mt-2 text-sm text-ink-soft">
          If it goes on, tell whoever runs this server the number <span className="mono">{number}</span>.
        </p>
      )}
      <div className="mt-5 flex flex-wrap gap-2">
        <Button kind="primary" onPress={retry}>
          Try again
        </Button>
        <ButtonLink href="/projects">Go to the projects</ButtonLink>
      </div>
    </StandAlone>
  );
}
