import type { StarterCheck } from "./starter";

const SOLDERING =
  "Irons and solder are hot, and flux fumes irritate: extract or blow them away. Wash your hands before you eat.";

/** What the eye finds before a meter is taken up. Order: cheap to see first, evidence last. */
export function afterSoldering({
  hasPolarised,
  hasValues,
}: {
  hasPolarised: boolean;
  hasValues: boolean;
}): StarterCheck[] {
  const checks: StarterCheck[] = [
    {
      id: "bare-board",
      stage: "inspection",
      title: "Board as ordered",
      instruction:
        "Compare revision letter, outline and thickness with the order. Look through the board against a lamp: no broken track at the edge, no drill hole off its pad, no copper hair between tracks.",
      reference: "IPC-A-600, in outline",
      kind: "statement",
      typed: { expects: "right revision, no damage" },
    },
    {
      id: "joints",
      stage: "inspection",
      title: "Every joint seen under the lens",
      instruction:
        "Go along each row under ten times magnification with the lamp low from the side. A good joint is wetted on pin and pad and curves inward. Look for bridges, balls, cold or disturbed joints, lifted pads, and pins that were never soldered.",
      caution: SOLDERING,
      reference: "IPC-A-610, in outline",
      holdPoint: true,
      kind: "statement",
      typed: { expects: "no bridge, all pins wetted" },
    },
  ];
  if (hasPolarised) {
    checks.push({
      id: "polarity",
      stage: "inspection",
      title: "Every polarised part the right way round",
      instruction:
        "Tick each one off on the placement print: electrolytic and tantalum capacitors, diodes, LEDs, connectors with a key, and pin 1 of every package against the mark on the board.",
      caution:
        "A tantalum or electrolytic capacitor the wrong way round can burst at first power. Wear glasses whenever a new board gets power.",
      reference: "IPC-A-610, in outline",
      holdPoint: true,
      kind: "statement",
      typed: { expects: "all as on the placement print" },
    });
  }
  if (hasValues) {
    checks.push({
      id: "values",
      stage: "inspection",
      title: "Part values and types as in the parts list",
      instruction:
        "Read the marking of every package and passive part against the parts list. Look twice at look-alikes: HC and HCT, LS and F, resistor networks with bussed and with separate ends, crystals.",
      caution: "Wear an earthed wrist strap when you touch unpacked parts or a board that is not in its bag.",
      reference: "IPC-A-610, in outline",
      kind: "statement",
      typed: { expects: "all as in the parts list" },
    });
  }
  checks.push({
    id: "pictures",
    stage: "inspection",
    title: "Both sides photographed",
    instruction:
      "Whole board, straight from above, both sides, so sharp that part markings can be read. These pictures answer questions months later.",
    kind: "photo",
    typed: { expects: "component side and solder side, whole board", minimum: "2" },
  });
  return checks;
}
