import type { Metadata } from "next";
import { Page } from "@/components/shell/Page";
import { Panel } from "@/components/ui/Panel";
import { definePage } from "@/lib/actions/define-page";

export const metadata: Metadata = { title: "Safety notes" };

const NOTES: readonly { title: string; text: string }[] = [
  {
    title: "Mains",
    text: "Leave mains to a certified supply with its cover on, or to a licensed person. Local electrical codes decide what you may open, connect and put into use; nothing here replaces them.",
  },
  {
    title: "Bench supplies",
    text: "First power goes through a current limit that was set with the outputs shorted, before the board is connected. A supply without a limit is not good enough for a first power-up.",
  },
  {
    title: "Charged capacitors",
    text: "They hold their charge for hours. Discharge them through a resistor, never with a screwdriver, and measure before you touch. One that sits the wrong way round can burst: wear glasses.",
  },
  {
    title: "Lithium cells",
    text: "Never charge a primary cell, short it or heat it. Take cells out for soldering. A swollen or hot cell goes outdoors onto stone.",
  },
  {
    title: "Hot irons and fumes",
    text: "Extract or blow flux fumes away, keep the iron in its stand, wash your hands before you eat. Regulators and shorted parts burn skin as well as an iron does.",
  },
  {
    title: "Static charge",
    text: "An earthed strap through a resistor, boards in their bags. A part that was hit can work today and fail in a month.",
  },
  {
    title: "Things that move",
    text: "Motors, relays, solenoids and pens can move at power-up before the logic decides anything. Unplug them for the first power, or keep fingers and cables clear and a hand on the switch.",
  },
];

export default definePage({
  permission: "public",
  path: () => "/safety",
  render: async () => (
    <Page
      title="Safety notes"
      lede="Bring-up can hurt people and destroy boards. Where a step can hurt, its check says so beside the instruction. This is what holds everywhere."
      width="prose"
    >
      <div className="flex flex-col gap-4">
        <Panel>
          <dl className="flex flex-col gap-5">
            {NOTES.map((note) => (
              <div key={note.title} className="border-b border-rule pb-5 last:border-b-0 last:pb-0">
                <dt className="font-head text-lg font-semibold">{note.title}</dt>
                <dd className="mt-1 text-ink-soft">{note.text}</dd>
              </div>
            ))}
          </dl>
        </Panel>
        <Panel title="What the program does not know">
          <p className="text-ink-soft">
            Verdicts and calculated values are planning aids. They follow the rule that the page names and leave out
            what it names; they are never a proof that something is safe. The starter procedures are written from trade
            practice for low-voltage boards and are yours to check, change and answer for.
          </p>
        </Panel>
      </div>
    </Page>
  ),
});
