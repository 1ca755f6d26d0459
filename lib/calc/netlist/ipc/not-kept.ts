/** Records that say nothing about which points belong together; they are counted, not kept. */
export const NOT_KEPT: Record<number, string> = {
  378: "records of tracks, not kept",
  78: "records of tracks, not kept",
  390: "marks that are not tested, not kept",
  90: "marks that are not tested, not kept",
  99: "places of a tester's pins, not kept",
  88: "clearances of the solder mask, not kept",
  309: "repeats of the board on a panel, not kept",
  370: "parts between two nets, not kept",
  70: "parts between two nets, not kept",
  380: "parts between two nets, not kept",
  80: "parts between two nets, not kept",
};
