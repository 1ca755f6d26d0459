import type { Metadata } from "next";
import { ProfileForm } from "@/components/account/ProfileForm";
import { SettingsPage } from "@/components/account/SettingsPage";
import { Panel } from "@/components/ui/Panel";
import { loadProfile } from "@/lib/account/load-profile";
import { timeZones } from "@/lib/account/time-zones";
import { definePage } from "@/lib/actions/define-page";
import { saveProfile } from "./actions";

export const metadata: Metadata = { title: "Your settings" };

export default definePage({
  permission: "own",
  path: () => "/settings",
  render: async (scope) => (
    <SettingsPage
      title="Profile"
      lede="How others see you and how Boardwake speaks to you. It holds for every project."
    >
      <Panel>
        <ProfileForm profile={await loadProfile(scope)} zones={timeZones()} save={saveProfile} />
      </Panel>
    </SettingsPage>
  ),
});
