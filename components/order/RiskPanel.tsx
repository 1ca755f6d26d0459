import { Icon } from "@/components/ui/Icon";
import { Panel } from "@/components/ui/Panel";
import type { BoardRisk } from "@/lib/calc/sequence";

/** What reaches a proven board from one that is not, as the machine stands. */
export function RiskPanel({ risks }: { risks: readonly BoardRisk[] }) {
  if (risks.length === 0) return null;
  return (
    <Panel title="Mind these in the machine" note={`${risks.length}`}>
      <ul>
        {risks.map(({ unproven, proven, sentence }) => (
          <li
            key={`${unproven} ${proven}`}
            className="flex gap-2.5 border-b border-rule py-2 text-[0.9375rem] last:border-b-0"
          >
            <Icon name="caution" className="mt-0.5 shrink-0 text-doubtful" />
            <span>{sentence}</span>
          </li>
        ))}
      </ul>
    </Panel>
  );
}
