import { useState } from "react";

/** One id for every try of the same change; a new one when it went through and the form is used again. */
export function useWriteId() {
  const [writeId, setWriteId] = useState(() => crypto.randomUUID());
  return { writeId, renew: () => setWriteId(crypto.randomUUID()) };
}
