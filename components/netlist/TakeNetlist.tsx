"use client";

import { useRouter } from "next/navigation";
import { useRef, useState } from "react";
import { Button } from "@/components/ui/Button";
import { FileDrop } from "@/components/ui/FileDrop";
import { useSubmit } from "@/components/ui/form/useSubmit";
import { Notice } from "@/components/ui/Notice";
import { Panel } from "@/components/ui/Panel";
import { RadioGroup } from "@/components/ui/RadioGroup";
import { Select } from "@/components/ui/Select";
import { toast } from "@/components/ui/toast-store";
import type { NetlistsView } from "@/lib/netlist/load-netlists";
import { NETLIST_LIMITS } from "@/lib/netlist/schema";
import { FilePreview } from "./FilePreview";
import { postNetlist } from "./post-netlist";
import { useNetlistFile } from "./use-netlist-file";

type Props = { project: string; revisions: NetlistsView["revisions"]; pinMap: NetlistsView["pinMap"] };
type From = "file" | "pin-map";

/** A netlist from a file or from the project's own pin map: what was read, and then the keeping. */
export function TakeNetlist({ project, revisions, pinMap }: Props) {
  const router = useRouter();
  const [revisionId, setRevision] = useState(revisions[0]?.id ?? "");
  const [from, setFrom] = useState<From>("file");
  const state = useNetlistFile();
  const { loaded, read, refused } = state;
  const file = read?.file;
  const given = from === "pin-map" ? ({ source: "pin-map" } as const) : read?.result.ok ? file : undefined;
  const sent = useRef<{ of: unknown; writeId: string }>(undefined);
  const { submit, isPending, error } = useSubmit(postNetlist, {
    onDone: ({ number }) => {
      toast({ text: `Netlist ${number} is kept.` });
      state.forget();
      router.refresh();
    },
  });

  function press() {
    if (!given) return;
    const of = from === "pin-map" ? from : file;
    // The same reading sent again is the same change; another one is another.
    const before = sent.current;
    const writeId = before && before.of === of && of !== "pin-map" ? before.writeId : crypto.randomUUID();
    sent.current = { of, writeId };
    void submit({ project, writeId, revisionId, given });
  }

  return (
    <Panel title="Take a netlist" note="Nothing is kept until you have seen how it was read and confirm it.">
      <div className="flex flex-col gap-5">
        <div className="flex flex-wrap gap-x-8 gap-y-4">
          <Select
            label="Of revision"
            className="w-44"
            options={revisions.map(({ id, letter }) => ({ id, label: `Revision ${letter}` }))}
            value={revisionId}
            onChange={setRevision}
          />
          <RadioGroup
            label="From"
            isInRow
            options={[
              { id: "file", label: "A file" },
              { id: "pin-map", label: "The project's own pin map", isDisabled: pinMap.nets === 0 },
            ]}
            value={from}
            onChange={(id) => setFrom(id === "pin-map" ? "pin-map" : "file")}
          />
        </div>
        {from === "file" ? (
          <FileDrop
            label={
              loaded ? `${loaded.name} is open. Another file?` : "A test file of the board house, or a list of pins"
            }
            hint={`IPC-D-356 or 356A, or a delimited list with net, part and pin. Up to ${NETLIST_LIMITS.bytes / 1e6} MB and ${NETLIST_LIMITS.points.toLocaleString("en-GB")} points.`}
            isMultiple={false}
            onFiles={(files) => void state.open(files)}
          />
        ) : (
          <p className="max-w-prose text-[0.9375rem]">
            {pinMap.nets} nets over {pinMap.points} pins of its connectors. The pin map knows nothing between the
            connectors: a round from it proves what reaches them.
          </p>
        )}
        {from === "file" && refused && <Notice kind="error">{refused} Nothing was kept.</Notice>}
        {from === "file" && loaded && read && (
          <FilePreview loaded={loaded} read={read} correct={(change) => state.correct(change)} />
        )}
        {error && <Notice kind="failed">{error.message}</Notice>}
        <div>
          <Button kind="primary" isDisabled={!given || revisionId === ""} isPending={isPending} onPress={press}>
            Keep as a new version
          </Button>
        </div>
      </div>
    </Panel>
  );
}
