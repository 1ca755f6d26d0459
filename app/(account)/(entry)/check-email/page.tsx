import type { Metadata } from "next";
import Link from "next/link";
import { AccountSheet } from "@/components/account/AccountSheet";
import { definePage } from "@/lib/actions/define-page";

export const metadata: Metadata = { title: "Look for our mail" };

const TEXTS: Record<string, { what: string; again: string; href: string }> = {
  link: {
    what: "If the address has an account, a link that signs you in is on its way. It works once, within 20 minutes.",
    again: "Ask for another link",
    href: "/sign-in",
  },
  "sign-up": {
    what: "We have sent you a link. Open it within two days to confirm the address and come in.",
    again: "Type the address again",
    href: "/sign-up",
  },
  reset: {
    what: "If the address has an account, a link to set a new password is on its way. It works once, within two hours.",
    again: "Ask for another link",
    href: "/forgot",
  },
};

const ANY = {
  what: "If the address has an account, our mail is on its way.",
  again: "Back to sign in",
  href: "/sign-in",
};

/** Says the same whether or not there is an account: nobody can find out here who has one. */
export default definePage({
  permission: "public",
  path: () => "/check-email",
  render: async (_scope, { search }) => {
    const text = TEXTS[typeof search.for === "string" ? search.for : ""] ?? ANY;
    return (
      <AccountSheet title="Look for our mail" lede={text.what}>
        <p className="text-[0.9375rem]">
          Nothing there after a few minutes? Look among the unwanted mail, and whether the address was typed as you
          meant it.
        </p>
        <p className="mt-3 text-[0.9375rem]">
          <Link className="link" href={text.href}>
            {text.again}
          </Link>
        </p>
      </AccountSheet>
    );
  },
});
