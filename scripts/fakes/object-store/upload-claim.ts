import { Refusal } from "../http/refusal";
import { uploadClaimSchema, type UploadClaim } from "./stored-object";

/** `x-ut-*` values are encoded twice: by hand, and as part of the address. */
function value(url: URL, name: string): string | undefined {
  const once = url.searchParams.get(name);
  return once === null || once === "" ? undefined : decodeURIComponent(once);
}

/** Reads what a signed upload address promises. The signature has been checked before. */
export function readUploadClaim(url: URL, appId: string): UploadClaim {
  const parsed = uploadClaimSchema.safeParse({
    key: decodeURIComponent(url.pathname.slice(1)),
    appId: value(url, "x-ut-identifier"),
    name: value(url, "x-ut-file-name"),
    size: value(url, "x-ut-file-size"),
    type: value(url, "x-ut-file-type"),
    slug: value(url, "x-ut-slug"),
    customId: value(url, "x-ut-custom-id"),
    contentDisposition: value(url, "x-ut-content-disposition"),
    acl: value(url, "x-ut-acl"),
  });
  if (!parsed.success)
    throw new Refusal(
      400,
      "validation_error",
      `The upload address is not complete: ${parsed.error.issues[0]?.path.join(".")}.`,
    );
  if (parsed.data.appId !== appId) throw new Refusal(403, "forbidden", "The address is for another app.");
  return parsed.data;
}
