"use client";

import { useRouter } from "next/navigation";
import { Button } from "react-aria-components";
import { Avatar } from "@/components/ui/Avatar";
import type { Reply } from "@/components/ui/form/reply";
import { useSubmit } from "@/components/ui/form/useSubmit";
import { Notice } from "@/components/ui/Notice";

export type DemoPerson = { name: string; email: string; password: string; role: string; does: string };
type Credentials = { email: string; password: string; next: string };

type Props = {
  people: readonly DemoPerson[];
  next: string;
  signIn: (input: Credentials) => Promise<Reply<{ next: string }>>;
};

/** In demo mode: one press signs in as somebody of the tide computer. */
export function DemoAccounts({ people, next, signIn }: Props) {
  const router = useRouter();
  const { submit, isPending, error } = useSubmit(signIn, { onDone: (done) => router.replace(done.next) });
  return (
    <section aria-labelledby="demo-title" className="mb-5 border-b border-rule pb-5">
      <h2 id="demo-title" className="text-base">
        This is a demonstration
      </h2>
      <p className="mt-0.5 text-sm text-ink-soft">Come in as one of the club that builds the tide computer.</p>
      <ul className="mt-3 flex flex-col gap-2">
        {people.map((person) => (
          <li key={person.email}>
            <Button
              isDisabled={isPending}
              onPress={() => void submit({ email: person.email, password: person.password, next })}
              className="flex min-h-14 w-full items-center gap-3 rounded-md border border-edge bg-raised px-3 py-2 text-left hover:border-ink-soft data-disabled:opacity-60"
            >
              <Avatar name={person.name} />
              <span className="min-w-0">
                <span className="block font-semibold">
                  {person.name}, {person.role}
                </span>
                <span className="block text-sm text-ink-soft">{person.does}</span>
              </span>
            </Button>
          </li>
        ))}
      </ul>
      {error && (
        <Notice kind="error" className="mt-3">
          {error.message}
        </Notice>
      )}
    </section>
  );
}
