import type { ReactNode } from "react";
import { PartsTabs } from "@/components/parts/PartsTabs";

type Props = { children: ReactNode; params: Promise<{ project: string }> };

export default async function PartsLayout({ children, params }: Props) {
  const { project } = await params;
  return (
    <>
      <div className="mx-auto max-w-sheet px-4 pt-3 sm:px-6 print:hidden">
        <PartsTabs project={project} />
      </div>
      {children}
    </>
  );
}
