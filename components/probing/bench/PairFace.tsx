import { BoardDrawing } from "@/components/probing/BoardDrawing";
import { ConnectorFace } from "@/components/ui/glyphs/ConnectorFace";
import { faceOf, pinNamed } from "@/lib/calc/connector";
import type { RoundPoint, RoundView } from "@/lib/probing/round-view";

type Props = { round: RoundView; a: RoundPoint; b: RoundPoint };

/** Where the two points lie: on the board when places are known, else on the connectors that they belong to. */
export function PairFace({ round: { drawing, points, faces }, a, b }: Props) {
  if (a.xMm !== null && b.xMm !== null) {
    return (
      <BoardDrawing
        points={points}
        outline={drawing.outline}
        lit={[
          { ...a, mark: "a" },
          { ...b, mark: "b" },
        ]}
        label={drawing.places === "faces" ? "The connectors side by side, from the card side" : "The board from above"}
      />
    );
  }
  const shown = faces.flatMap((connector) => {
    const face = faceOf(connector);
    const lit = [a, b].flatMap(({ name }) => {
      const pin = name.startsWith(`${connector.reference}-`) ? name.slice(connector.reference.length + 1) : undefined;
      return (face && pin !== undefined && pinNamed(face, pin)?.name) || [];
    });
    return face && lit.length > 0 ? [{ reference: connector.reference, face, lit: new Set(lit) }] : [];
  });
  return shown.map(({ reference, face, lit }) => (
    <figure key={reference} className="grid-paper rounded-md border border-rule px-3 py-2">
      <ConnectorFace face={face} lit={lit} label={`Connector ${reference}`} className="w-full" />
      <figcaption className="mt-1 text-sm text-ink-soft">{reference}, from the card side</figcaption>
    </figure>
  ));
}
