import Link from "next/link";
import { Notice } from "@/components/ui/Notice";
import { Panel } from "@/components/ui/Panel";

/** By which rules the page reckons, what it does not know, and where its figures end. */
export function RulesPanel() {
  return (
    <>
      <Notice kind="caution" title="Mains and supplies">
        <p>
          Leave mains inside a supply to a certified supply or a licensed person. Local electrical codes have the last
          word; nothing here replaces a fuse.
        </p>
        <p>
          <Link href="/safety" className="link">
            What can hurt at the bench
          </Link>
        </p>
      </Notice>
      <Panel title="By which rules">
        <ul className="flex flex-col gap-2.5 text-sm text-ink-soft">
          <li>
            <strong className="font-semibold text-ink">Logic:</strong> at rest plus Cpd · V² · f and C · V² · f, as
            makers&rsquo; sheets write it; the clock, the activity and the load are those of the board&rsquo;s plan.
            Left out: glitches, which in deep logic may double it, and inrush.
          </li>
          <li>
            <strong className="font-semibold text-ink">Supply:</strong> worst currents of all boards at once against
            what it gives; less than a fifth left is scant (common practice, no source).
          </li>
          <li>
            <strong className="font-semibold text-ink">Contacts:</strong> IEC 60603-2 (DIN 41612) derating as read in
            data sheets: 2 A at 20 °C, 1 A at 70 °C, 0.5 A at 100 °C, straight lines between. Contacts of one rail are
            taken to share alike.
          </li>
          <li>
            <strong className="font-semibold text-ink">Copper:</strong> drop by 1.72 × 10⁻⁸ Ω m at 20 °C, warmer with
            the air, and 20 mΩ a contact; what it bears by the fit to the charts of IPC-2221, outer layer, 10 K. Left
            out: currents of other rails in the same ground, sense lines, the copper&rsquo;s own heat in the drop.
          </li>
        </ul>
      </Panel>
    </>
  );
}
