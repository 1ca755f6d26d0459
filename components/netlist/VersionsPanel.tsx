"use client";

import { useRouter } from "next/navigation";
import { Button } from "@/components/ui/Button";
import { DateTime } from "@/components/ui/DateTime";
import { Panel } from "@/components/ui/Panel";
import { Select } from "@/components/ui/Select";
import { counted } from "@/components/workshop/counted";
import { Disclosure } from "@/components/workshop/Disclosure";
import type { NetlistVersion, ShownDifference } from "@/lib/netlist/load-netlists";
import { useState } from "react";
import { LineNotes } from "./LineNotes";

const SOURCES: Record<NetlistVersion["source"], string> = {
  "ipc-d-356": "IPC-D-356",
  "pin-list": "list of pins",
  "pin-map": "the project's pin map",
};

type Props = {
  versions: readonly NetlistVersion[];
  compared: Pick<ShownDifference, "before" | "after"> | undefined;
  address: string;
  zone: string;
};

/** Every version that was kept; two of them can be laid side by side. */
export function VersionsPanel({ versions, compared, address, zone }: Props) {
  return (
    <Panel title="Versions" note={counted(versions.length, "version")}>
      <ul className="flex flex-col">
        {versions.map((version) => (
          <VersionRow key={version.id} version={version} zone={zone} />
        ))}
      </ul>
      {versions.length > 1 && <Compare versions={versions} compared={compared} address={address} />}
    </Panel>
  );
}

function VersionRow({ version, zone }: { version: NetlistVersion; zone: string }) {
  const { letter, number, source, fileName, nets, points, passedOver, by, at } = version;
  return (
    <li className="border-b border-rule py-3 first:pt-0 last:border-b-0 last:pb-0">
      <div className="grid gap-x-4 gap-y-0.5 sm:grid-cols-[9rem_minmax(0,1fr)_auto]">
        <p className="font-semibold">
          Rev {letter}, netlist {number}
        </p>
        <p className="min-w-0">
          <span className="mono text-sm">{nets.toLocaleString("en-GB")}</span> nets,{" "}
          <span className="mono text-sm">{points.toLocaleString("en-GB")}</span> points, from {SOURCES[source]}
          {fileName !== "" && <span className="mono block truncate text-xs text-ink-soft">{fileName}</span>}
        </p>
        <p className="text-sm text-ink-soft sm:text-right">
          {by ?? "somebody"}, <DateTime at={at} zone={zone} form="short" />
        </p>
      </div>
      {passedOver.length > 0 && (
        <Disclosure summary={`${counted(passedOver.length, "line")} passed over`}>
          <LineNotes notes={passedOver} tone="failed" />
        </Disclosure>
      )}
    </li>
  );
}

type CompareProps = Omit<Props, "zone">;

function Compare({ versions, compared, address }: CompareProps) {
  const router = useRouter();
  const [before, setBefore] = useState(compared?.before ?? versions[1]?.id ?? "");
  const [after, setAfter] = useState(compared?.after ?? versions[0]?.id ?? "");
  const options = versions.map(({ id, letter, number }) => ({ id, label: `Rev ${letter}, netlist ${number}` }));
  return (
    <div className="mt-4 flex flex-wrap items-end gap-3 border-t border-rule pt-4">
      <Select label="From" className="w-48" options={options} value={before} onChange={setBefore} />
      <Select label="To" className="w-48" options={options} value={after} onChange={setAfter} />
      <Button
        isDisabled={before === after}
        onPress={() => router.push(`${address}?before=${before}&after=${after}`, { scroll: false })}
      >
        Compare
      </Button>
    </div>
  );
}
