"use client";

import { useEffect, useState } from "react";
import { SearchButton } from "@/components/shell/SearchButton";
import { isTyping } from "@/components/ui/is-typing";
import { SearchSheet } from "./SearchSheet";

/** The field in the header and the sheet that “/” or Ctrl+K lays over the page. */
export function ProjectSearch({ project }: { project: string }) {
  const [isOpen, setOpen] = useState(false);

  useEffect(() => {
    function open(event: KeyboardEvent) {
      const slash = event.key === "/" && !event.ctrlKey && !event.metaKey && !event.altKey && !isTyping(event.target);
      const chord =
        event.key.toLowerCase() === "k" && (event.ctrlKey || event.metaKey) && !event.altKey && !event.shiftKey;
      if (!slash && !chord) return;
      event.preventDefault();
      setOpen(true);
    }
    window.addEventListener("keydown", open);
    return () => window.removeEventListener("keydown", open);
  }, []);

  return (
    <>
      <SearchButton onPress={() => setOpen(true)} />
      <SearchSheet key={String(isOpen)} project={project} isOpen={isOpen} onOpenChange={setOpen} />
    </>
  );
}
