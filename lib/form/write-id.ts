import { z } from "zod";

/** The client's own id of one change; see lib/event/change.ts. */
export const writeId = z.uuid({ message: "The id of this change is missing. Reload the page and try again." });
