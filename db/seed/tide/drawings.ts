import sharp from "sharp";

/**
 * The demo's pictures, drawn here and nowhere else: boards from above, a scope's screen, the panel.
 * A small generator with a fixed seed varies them, so that the same demo has the same pictures everywhere.
 */
export function generator(seed: string): () => number {
  let state = [...seed].reduce((sum, letter) => (sum * 31 + letter.charCodeAt(0)) >>> 0, 7);
  return () => {
    state = (Math.imul(state, 1664525) + 1013904223) >>> 0;
    return state / 2 ** 32;
  };
}

const MASK = "#12403a";
const SILK = "#e8e4d2";
const PAD = "#c9b27a";

const rect = (x: number, y: number, w: number, h: number, fill: string, radius = 0) =>
  `<rect x="${x}" y="${y}" width="${w}" height="${h}" rx="${radius}" fill="${fill}"/>`;

function packageFromAbove(x: number, y: number, pins: number, name: string): string {
  const side = pins / 2;
  const width = side * 22 + 8;
  const legs = Array.from({ length: side }, (_, i) => rect(x + 9 + i * 22, y - 9, 9, 70, PAD, 2)).join("");
  return `${legs}${rect(x, y, width, 52, "#20211f", 4)}<circle cx="${x + 10}" cy="${y + 40}" r="4" fill="#3c3d39"/>
    <text x="${x + width / 2}" y="${y + 33}" font-size="18" fill="#b9b7ac" text-anchor="middle" font-family="monospace">${name}</text>`;
}

function edgeConnector(y: number): string {
  const pads = Array.from(
    { length: 32 },
    (_, i) => rect(170 + i * 40, y + 34, 13, 26, PAD, 3) + rect(170 + i * 40, y + 78, 13, 26, PAD, 3),
  );
  return rect(140, y, 1320, 120, "#b7aa8c", 8) + pads.join("");
}

/** Component side of a card with its packages in rows; `wires` draws bodge wires over it. */
export function boardPicture(code: string, packages: number, wires = 0): string {
  const next = generator(code);
  const chips = Array.from({ length: packages }, (_, i) => {
    const x = 150 + (i % 4) * 340;
    const y = 330 + Math.floor(i / 4) * 190;
    return packageFromAbove(x, y, next() > 0.5 ? 16 : 20, `U${i + 1}`) + rect(x + 250, y + 6, 22, 40, "#b5651d", 4);
  });
  const bodges = Array.from({ length: wires }, (_, i) => {
    const y = 420 + i * 130;
    return `<path d="M${260 + i * 90} ${y} C 600 ${y - 160}, 900 ${y + 220}, ${1180 - i * 60} ${y + 130}" stroke="#f2efe4" stroke-width="9" fill="none" stroke-linecap="round"/>`;
  });
  return svg(
    1600,
    1200,
    rect(0, 0, 1600, 1200, "#b8a988") +
      rect(60, 60, 1480, 1080, MASK, 14) +
      edgeConnector(100) +
      chips.join("") +
      bodges.join("") +
      `<text x="1500" y="1100" font-size="44" fill="${SILK}" text-anchor="end" font-family="monospace">TIDE · ${code}</text>`,
  );
}

export function solderSidePicture(code: string, wires: number): string {
  const next = generator(`solder ${code}`);
  const joints = Array.from({ length: 420 }, () => {
    const x = 120 + Math.round(next() * 34) * 40;
    const y = 150 + Math.round(next() * 22) * 40;
    return `<circle cx="${x}" cy="${y}" r="11" fill="#b9bec0"/><circle cx="${x - 3}" cy="${y - 3}" r="4" fill="#e6eaeb"/>`;
  });
  const bodges = Array.from(
    { length: wires },
    (_, i) =>
      `<path d="M${480 + i * 120} 390 C 700 ${260 + i * 200}, 980 ${700 - i * 90}, ${1040 + i * 40} 790" stroke="#f2efe4" stroke-width="10" fill="none" stroke-linecap="round"/>`,
  );
  return svg(
    1600,
    1200,
    rect(0, 0, 1600, 1200, "#b8a988") + rect(60, 60, 1480, 1080, "#0f352f", 14) + joints.join("") + bodges.join(""),
  );
}

export function backplanePicture(): string {
  const slots = Array.from({ length: 8 }, (_, i) => {
    const y = 130 + i * 120;
    return (
      rect(150, y, 1300, 74, "#cfc4a8", 8) +
      Array.from({ length: 64 }, (_, p) =>
        rect(170 + (p % 32) * 40, y + 14 + Math.floor(p / 32) * 30, 14, 14, "#7a4a1e", 3),
      ).join("")
    );
  });
  return svg(1600, 1200, rect(0, 0, 1600, 1200, "#a89672") + rect(70, 70, 1460, 1060, MASK, 12) + slots.join(""));
}

export function panelPicture(): string {
  const lamps = Array.from({ length: 32 }, (_, i) => {
    const x = 210 + (i % 16) * 78;
    const y = 330 + Math.floor(i / 16) * 170;
    return `<circle cx="${x}" cy="${y}" r="34" fill="#5a2410" opacity="0.55"/><circle cx="${x}" cy="${y}" r="21" fill="#ff8a3c"/><circle cx="${x - 6}" cy="${y - 7}" r="7" fill="#ffe2c4"/>`;
  });
  const switches = Array.from(
    { length: 16 },
    (_, i) =>
      rect(192 + i * 78, 690, 36, 90, "#2a2a28", 8) + rect(200 + i * 78, i % 3 === 0 ? 700 : 740, 20, 30, "#d8d2c0", 5),
  );
  return svg(
    1600,
    1000,
    rect(0, 0, 1600, 1000, "#23211d") + rect(90, 160, 1420, 700, "#34322c", 16) + lamps.join("") + switches.join(""),
  );
}

/** A scope's screen from a function of 0 … 1 to −1 … 1; one or two traces. */
export function scopePicture(traces: ((t: number) => number)[], scale: string): string {
  const grid = Array.from(
    { length: 9 },
    (_, i) => `<path d="M${160 + i * 160} 60V940M80 ${60 + i * 110}H1520" stroke="#3a4a45" stroke-width="2"/>`,
  ).join("");
  const colours = ["#f0b35a", "#7cc4d8"];
  const lines = traces.map((trace, index) => {
    const points = Array.from({ length: 700 }, (_, i) => {
      const t = i / 699;
      const middle = traces.length === 1 ? 500 : 300 + index * 420;
      return `${(80 + t * 1440).toFixed(1)},${(middle - trace(t) * (traces.length === 1 ? 330 : 150)).toFixed(1)}`;
    });
    return `<polyline points="${points.join(" ")}" fill="none" stroke="${colours[index] ?? "#f0b35a"}" stroke-width="5"/>`;
  });
  return svg(
    1600,
    1000,
    rect(0, 0, 1600, 1000, "#0d1512") +
      grid +
      lines.join("") +
      `<text x="90" y="985" font-size="34" fill="#b9c7c0" font-family="monospace">${scale}</text>`,
  );
}

function svg(width: number, height: number, content: string): string {
  return `<svg xmlns="http://www.w3.org/2000/svg" viewBox="0 0 ${width} ${height}" width="${width}" height="${height}">${content}</svg>`;
}

export function jpeg(drawing: string): Promise<Buffer> {
  return sharp(Buffer.from(drawing)).jpeg({ quality: 82 }).toBuffer();
}

export function png(drawing: string): Promise<Buffer> {
  return sharp(Buffer.from(drawing)).png({ compressionLevel: 9, palette: true }).toBuffer();
}
