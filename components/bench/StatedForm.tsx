import type { Judged } from "@/lib/check-kinds/kind";

type Props = { conforms: boolean | null; judged: Judged | undefined };

/** Shown while a stated verdict waits for what must go with it, such as a photo or a note. */
export function StatedForm({ conforms, judged }: Props) {
  if (conforms === null || !judged || judged.ok) return null;
  return (
    <p role="status" className="text-failed text-base font-semibold">
      {judged.message}
    </p>
  );
}
