import { cookies } from "next/headers";
import type { ReactNode } from "react";
import { AppHeader } from "@/components/shell/AppHeader";
import type { Crumb } from "@/components/ui/Breadcrumbs";
import { ButtonLink } from "@/components/ui/ButtonLink";
import { asTheme, THEME_COOKIE } from "@/components/ui/theme";
import { OwnMenu } from "@/components/workshop/OwnMenu";
import { SavedThemeSwitch } from "@/components/workshop/SavedThemeSwitch";
import { currentViewer } from "@/lib/auth/current-viewer";
import { setTheme, signOut } from "./actions";

type Props = { crumbs?: readonly Crumb[]; search?: ReactNode; nav?: ReactNode };

/** The header of every page for people who are signed in, and of the public pages. */
export async function WorkshopHeader({ crumbs, search, nav }: Props) {
  const viewer = await currentViewer();
  const theme = asTheme((await cookies()).get(THEME_COOKIE)?.value);
  return (
    <AppHeader
      home={viewer ? "/projects" : "/"}
      {...(crumbs ? { crumbs } : {})}
      search={search}
      nav={nav}
      theme={<SavedThemeSwitch key={theme} theme={theme} {...(viewer ? { save: setTheme } : {})} />}
      account={
        viewer ? (
          <OwnMenu name={viewer.name} email={viewer.email} signOut={signOut} />
        ) : (
          <ButtonLink href="/sign-in">Sign in</ButtonLink>
        )
      }
    />
  );
}
