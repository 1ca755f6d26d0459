"use client";

import { useEffect } from "react";
import { StandAlone } from "@/components/shell/StandAlone";
import { Button } from "@/components/ui/Button";
import { ButtonLink } from "@/components/ui/ButtonLink";
import { errorNumber } from "@/components/shell/error-number";
import { DATABASE_AWAY } from "@/lib/actions/database-away";

export default function ErrorPage({ error, retry }: { error: unknown; retry: () => void }) {
  const number = errorNumber(error);
  if (number === DATABASE_AWAY) return <DatabaseAway retry={retry} />;
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

const TRY_AGAIN_MS = 10_000;

/** Looks again by itself: at the bench nobody has a hand free. */
function DatabaseAway({ retry }: { retry: () => void }) {
  useEffect(() => {
    const timer = setInterval(retry, TRY_AGAIN_MS);
    return () => clearInterval(timer);
  }, [retry]);
  return (
    <StandAlone state="waiting" code="503" title="The database does not answer">
      <p>
        Nothing that was recorded is lost. Attempts held on this device go out when it is back. This page looks again
        every ten seconds by itself.
      </p>
      <div className="mt-5 flex flex-wrap gap-2">
        <Button kind="primary" onPress={retry}>
          Try again
        </Button>
      </div>
    </StandAlone>
  );
}
