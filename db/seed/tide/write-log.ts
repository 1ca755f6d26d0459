import { writeLogEntry } from "@/lib/log-entry/write-log-entry";
import { eveningAt, type Happening } from "./calendar";
import { granted } from "./granted";
import { LOG } from "./story";
import type { Cast } from "./tell-story";
import { uploadPicture } from "./upload-picture";

const CAPTIONS: Record<string, string> = {
  backplane: "Card side, row a to the left",
  "board-SUP": "SUP-01, the regulator that sits the wrong way round",
  "scope-clock": "PHI1 at slot 8",
  "board-CON": "CON-01 before the wires",
  panel: "Lamp test",
  "solder-CON": "Solder side with W1 to W3",
  "scope-carry": "PH7 and CARRY_N, slow clock",
  "board-OUT": "The pen driver, still in its bag",
};

export function logHappenings(cast: Cast, now: Date): Happening[] {
  return LOG.map((entry) => {
    const { scope } = cast[entry.by];
    return {
      at: eveningAt(now, entry.daysAgo, 130, scope.timeZone),
      work: async () => {
        const pictures = [];
        for (const name of entry.pictures) {
          pictures.push({ id: await uploadPicture(scope, {}, name), caption: CAPTIONS[name] ?? "" });
        }
        const { title, body } = entry;
        const form = {
          project: scope.slug,
          writeId: crypto.randomUUID(),
          title,
          body,
          unit: entry.serial ?? "",
          pictures,
        };
        granted(await writeLogEntry(scope, form));
      },
    };
  });
}
