"use client";

import { useRouter } from "next/navigation";
import { Button } from "@/components/ui/Button";
import type { Reply } from "@/components/ui/form/reply";
import { useSubmit } from "@/components/ui/form/useSubmit";

/** Signs out and stays on the page, which then asks anew who one is. */
export function SignOutButton({ signOut }: { signOut: (input: Record<string, never>) => Promise<Reply<null>> }) {
  const router = useRouter();
  const { submit, isPending } = useSubmit(signOut, { onDone: () => router.refresh() });
  return (
    <Button kind="primary" isPending={isPending} onPress={() => void submit({})}>
      Sign out
    </Button>
  );
}
