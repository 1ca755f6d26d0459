import type { Database } from "@/db/client";
import { writeLogEntry } from "@/lib/log-entry/write-log-entry";
import { eveningAt, happening } from "./calendar";
import { granted } from "./granted";
import { LOG } from "./story";
import type { Cast } from "./tell-story";
import { uploadPicture } from "./upload-picture";

const CAPTIONS: Record<string, string> = {
  backplane: "Card side, row a to the left",
  "board-SUP": "SUP-01, the regulator that sits the wrong way round",
  "scope-clock": "PH1 at slot 8",
  "board-CON": "CON-01 before the wires",
  panel: "Lamp test",
  "solder-CON": "Solder side with W1 to W3",
  "scope-carry": "PH7 and CARRY_N, slow clock",
  "board-OUT": "The pen driver, still in its bag",
};

export async function writeLog(db: Database, cast: Cast, now: Date): Promise<void> {
  for (const entry of LOG) {
    const { scope } = cast[entry.by];
    await happening(db, eveningAt(now, entry.daysAgo, 130, scope.timeZone), async () => {
      const pictures = [];
      for (const name of entry.pictures) {
        pictures.push({ id: await uploadPicture(scope, {}, name), caption: CAPTIONS[name] ?? "" });
      }
      const { title, body } = entry;
      const unit = entry.serial ?? "";
      granted(
        await writeLogEntry(scope, { project: scope.slug, writeId: crypto.randomUUID(), title, body, unit, pictures }),
      );
    });
  }
}
