import { Button, Heading, Link, Text } from "@react-email/components";
import type { ReactNode } from "react";
import { light } from "./palette";

export function Title({ children }: { children: ReactNode }) {
  return (
    <Heading
      as="h1"
      className="bw-ink"
      style={{ color: light.ink, fontSize: 24, lineHeight: "30px", margin: "8px 0 12px" }}
    >
      {children}
    </Heading>
  );
}

export function Line({ children, soft = false }: { children: ReactNode; soft?: boolean }) {
  return (
    <Text
      className={soft ? "bw-soft" : "bw-ink"}
      style={{
        color: soft ? light.inkSoft : light.ink,
        fontSize: soft ? 14 : 16,
        lineHeight: soft ? "21px" : "25px",
        margin: "0 0 14px",
      }}
    >
      {children}
    </Text>
  );
}

export function Act({ href, children }: { href: string; children: string }) {
  return (
    <Button
      href={href}
      className="bw-button"
      style={{
        backgroundColor: light.copper,
        borderRadius: 6,
        color: light.onCopper,
        display: "inline-block",
        fontSize: 16,
        fontWeight: 700,
        margin: "4px 0 18px",
        padding: "13px 22px",
        textDecoration: "none",
      }}
    >
      {children}
    </Button>
  );
}

/** The address in full, for readers that strip buttons and for people who copy; the text form has it anyway. */
export function PlainAddress({ href }: { href: string }) {
  return (
    <Text
      data-skip-in-text="true"
      className="bw-soft"
      style={{ color: light.inkSoft, fontSize: 13, lineHeight: "20px", margin: 0, wordBreak: "break-all" }}
    >
      If the button does not work, open this address: <Link href={href}>{href}</Link>
    </Text>
  );
}
