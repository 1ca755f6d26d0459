import type { Metadata } from "next";
import { PasswordForm } from "@/components/account/PasswordForm";
import { SessionList } from "@/components/account/SessionList";
import { SettingsPage } from "@/components/account/SettingsPage";
import { Panel } from "@/components/ui/Panel";
import { loadProfile } from "@/lib/account/load-profile";
import { loadSessions } from "@/lib/account/sessions";
import { definePage } from "@/lib/actions/define-page";
import { currentSessionKey } from "@/lib/auth/session-cookie";
import { changePassword, endSession, signOutEverywhere } from "./actions";

export const metadata: Metadata = { title: "Password and sessions" };

export default definePage({
  permission: "own",
  path: () => "/settings/password",
  render: async (scope) => {
    const [profile, sessions] = await Promise.all([loadProfile(scope), loadSessions(scope, await currentSessionKey())]);
    return (
      <SettingsPage
        title="Password and sessions"
        lede="A new password signs you out on every other device at once. A session ends by itself after 30 days."
      >
        <Panel title={profile.hasPassword ? "Change the password" : "Set a password"}>
          <PasswordForm email={profile.email} hasPassword={profile.hasPassword} change={changePassword} />
        </Panel>
        <Panel title="Where you are signed in" padding="none">
          <SessionList
            sessions={sessions}
            zone={scope.viewer.timeZone}
            endSession={endSession}
            endAll={signOutEverywhere}
          />
        </Panel>
      </SettingsPage>
    );
  },
});
