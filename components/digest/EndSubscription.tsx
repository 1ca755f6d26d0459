"use client";

import { useState } from "react";
import { Button } from "@/components/ui/Button";
import type { Reply } from "@/components/ui/form/reply";
import { useSubmit } from "@/components/ui/form/useSubmit";
import { Notice } from "@/components/ui/Notice";

type Link = { subscription: string; token: string };
type Act = (link: Link) => Promise<Reply<{ enabled: boolean }>>;
type Props = { link: Link; projectName: string | null; isOn: boolean; unsubscribe: Act; subscribeAgain: Act };

/** One press ends it, another turns it on again; opening the page does neither. */
export function EndSubscription({ link, projectName, isOn, unsubscribe, subscribeAgain }: Props) {
  const [enabled, setEnabled] = useState(isOn);
  const done = { onDone: (value: { enabled: boolean }) => setEnabled(value.enabled) };
  const end = useSubmit(unsubscribe, done);
  const again = useSubmit(subscribeAgain, done);
  const error = end.error ?? again.error;
  return (
    <div className="flex flex-col items-start gap-4">
      {error && <Notice kind="error">{error.message}</Notice>}
      {enabled ? (
        <Button kind="primary" size="lg" isPending={end.isPending} onPress={() => void end.submit(link)}>
          Send me no more
        </Button>
      ) : (
        <>
          <Notice kind="passed" role="status">
            <p>
              {projectName === null
                ? "You get no weekly e-mail of this project."
                : `You get no weekly e-mail of ${projectName} any more. You are still a member of the project.`}
            </p>
          </Notice>
          {projectName !== null && (
            <Button isPending={again.isPending} onPress={() => void again.submit(link)}>
              Turn it on again
            </Button>
          )}
        </>
      )}
    </div>
  );
}
