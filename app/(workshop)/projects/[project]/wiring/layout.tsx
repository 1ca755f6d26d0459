import type { ReactNode } from "react";
import { WiringTabs } from "@/components/wiring/WiringTabs";

type Props = { children: ReactNode; params: Promise<{ project: string }> };

/** The sub-places stand above the titles, so that they stay where they are. */
export default async function WiringLayout({ children, params }: Props) {
  const { project } = await params;
  return (
    <>
      <div data-chrome className="mx-auto max-w-sheet px-4 pt-3 sm:px-6">
        <WiringTabs project={project} />
      </div>
      {children}
    </>
  );
}
