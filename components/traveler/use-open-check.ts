import { useCallback, useEffect, useState } from "react";

/** Which check is open, kept in the address so that it can be passed on. The row of a check that was asked for is shown. */
export function useOpenCheck(asked: string | undefined) {
  const [openId, setOpenId] = useState(asked);

  useEffect(() => {
    if (asked) document.getElementById(`check-${asked}`)?.scrollIntoView({ block: "center" });
  }, [asked]);

  const open = useCallback((id: string | undefined) => {
    setOpenId(id);
    const address = new URL(location.href);
    if (id) address.searchParams.set("check", id);
    else address.searchParams.delete("check");
    history.replaceState(null, "", address);
  }, []);

  return { openId, open };
}
