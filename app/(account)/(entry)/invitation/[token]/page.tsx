import type { Metadata } from "next";
import { AcceptInvitation } from "@/components/account/AcceptInvitation";
import { AccountSheet } from "@/components/account/AccountSheet";
import { InvitationSheet } from "@/components/account/InvitationSheet";
import { InvitedSignUp } from "@/components/account/InvitedSignUp";
import { SignOutButton } from "@/components/account/SignOutButton";
import { ButtonLink } from "@/components/ui/ButtonLink";
import { Notice } from "@/components/ui/Notice";
import { definePage } from "@/lib/actions/define-page";
import { lookAtInvitation, type InvitationView } from "@/lib/invitation/look-at-invitation";
import { accept, signOutHere, signUp } from "./actions";

export const metadata: Metadata = { title: "Invitation", referrer: "no-referrer" };

export default definePage({
  permission: "public",
  path: ({ token }) => `/invitation/${token}`,
  render: async ({ viewer }, { params: { token = "" }, path }) => {
    const view = await lookAtInvitation(viewer, token);
    if (view.step === "failed") return <Failed view={view} isSignedIn={viewer !== undefined} />;
    return (
      <InvitationSheet details={view.details}>
        <NextStep view={view} token={token} path={path} />
      </InvitationSheet>
    );
  },
});

type Step = Exclude<InvitationView, { step: "failed" }>;

function NextStep({ view, token, path }: { view: Step; token: string; path: string }) {
  switch (view.step) {
    case "accept":
      return <AcceptInvitation token={token} projectName={view.details.projectName} accept={accept} />;
    case "sign-up":
      return <InvitedSignUp token={token} email={view.details.email} signUp={signUp} />;
    case "sign-in":
      return (
        <Notice
          kind="info"
          actions={
            <ButtonLink kind="primary" href={`/sign-in?next=${encodeURIComponent(path)}`}>
              Sign in and come back
            </ButtonLink>
          }
        >
          This address has an account. Sign in as {view.details.email} and join with one press.
        </Notice>
      );
    case "wrong-address":
      return (
        <Notice kind="caution" actions={<SignOutButton signOut={signOutHere} />}>
          {view.sentence}
        </Notice>
      );
  }
}

function Failed({ view, isSignedIn }: { view: Extract<InvitationView, { step: "failed" }>; isSignedIn: boolean }) {
  return (
    <AccountSheet title="Invitation">
      <Notice
        kind="error"
        actions={
          view.open ? (
            <ButtonLink href={view.open.path}>Open {view.open.name}</ButtonLink>
          ) : isSignedIn ? (
            <ButtonLink href="/projects">Your projects</ButtonLink>
          ) : (
            <ButtonLink href="/sign-in">Sign in</ButtonLink>
          )
        }
      >
        {view.sentence}
      </Notice>
    </AccountSheet>
  );
}
