"use client";

import { Markdown } from "@/components/ui/Markdown";
import { Tabs } from "@/components/ui/Tabs";
import { TextArea } from "@/components/ui/TextArea";
import { ENTRY_LIMITS } from "@/lib/log-entry/schema";

type Props = { value: string; onChange: (value: string) => void; error: string | undefined };

/** The text and, one tab further, the text as it will read. */
export function BodyField({ value, onChange, error }: Props) {
  return (
    <Tabs
      label="Text"
      tabs={[
        {
          id: "write",
          label: "Write",
          content: (
            <TextArea
              label="Text"
              isLabelHidden
              rows={12}
              value={value}
              onChange={onChange}
              maxLength={ENTRY_LIMITS.body}
              error={error}
              description="Markdown: **bold**, - list, [link](https://…), `CLK`. HTML is left out."
            />
          ),
        },
        {
          id: "preview",
          label: "Preview",
          content: (
            <div className="min-h-52 rounded-lg border border-rule bg-sheet px-4 py-4 sm:px-5">
              {value.trim() === "" ? <p className="text-ink-soft">Nothing written yet.</p> : <Markdown text={value} />}
            </div>
          ),
        },
      ]}
    />
  );
}
