import type { Metadata } from "next";
import { SettingsPage } from "@/components/account/SettingsPage";
import { InstrumentDialog } from "@/components/instrument/InstrumentDialog";
import { InstrumentList } from "@/components/instrument/InstrumentList";
import { definePage } from "@/lib/actions/define-page";
import { loadInstruments } from "@/lib/instrument/load-instruments";
import { archiveInstrument, restoreInstrument, saveInstrument } from "./actions";

export const metadata: Metadata = { title: "Instruments" };

export default definePage({
  permission: "own",
  path: () => "/settings/instruments",
  render: async (scope) => (
    <SettingsPage
      title="Instruments"
      lede="Your meters, scopes and supplies with the accuracy that their makers state. A reading is judged with the accuracy of the instrument it was taken with."
      actions={<InstrumentDialog save={saveInstrument} />}
    >
      <InstrumentList
        instruments={await loadInstruments(scope)}
        save={saveInstrument}
        archive={archiveInstrument}
        restore={restoreInstrument}
      />
    </SettingsPage>
  ),
});
