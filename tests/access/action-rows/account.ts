import type { Rows } from "./row";

export const accountRows: Record<string, Rows> = {
  "app/(account)/(entry)/confirm/[token]/actions.ts": { confirm: { permission: "public" } },
  "app/(account)/(entry)/forgot/actions.ts": { requestReset: { permission: "public" } },
  "app/(account)/(entry)/invitation/[token]/actions.ts": {
    accept: { permission: "own" },
    signUp: { permission: "public" },
    signOutHere: { permission: "public" },
  },
  "app/(account)/(entry)/reset/[token]/actions.ts": { reset: { permission: "public" } },
  "app/(account)/(entry)/sign-in/actions.ts": {
    signIn: { permission: "public" },
    sendSignInLink: { permission: "public" },
  },
  "app/(account)/(entry)/sign-up/actions.ts": { signUp: { permission: "public" } },
  "app/(account)/(entry)/unsubscribe/[subscription]/[token]/actions.ts": {
    unsubscribe: { permission: "public" },
    subscribeAgain: { permission: "public" },
  },
  "app/(account)/settings/actions.ts": { saveProfile: { permission: "own" } },
  "app/(account)/settings/digest/actions.ts": {
    updateSubscription: {
      permission: "digest.own",
      input: () => ({ enabled: false, weekday: 3, hour: 7, zone: "Europe/Lisbon", quietWeek: "nothing" }),
    },
  },
  "app/(account)/settings/instruments/actions.ts": {
    saveInstrument: { permission: "own" },
    archiveInstrument: { permission: "own" },
    restoreInstrument: { permission: "own" },
  },
  "app/(account)/settings/password/actions.ts": {
    changePassword: { permission: "own" },
    endSession: { permission: "own" },
    signOutEverywhere: { permission: "own" },
  },
  "app/(workshop)/actions.ts": { signOut: { permission: "public" }, setTheme: { permission: "own" } },
};
