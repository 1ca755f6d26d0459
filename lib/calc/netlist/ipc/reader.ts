import { LineNotes } from "../line-notes";
import { NetCollector } from "../net-collector";
import type { NetPoint, PointKind, ToolingHole } from "../netlist";
import { digitsAt } from "./fields";
import { IpcHeader } from "./header";
import { joinRecord } from "./join-record";
import { NeighbourReader } from "./neighbours";
import { NOT_KEPT } from "./not-kept";
import { OutlineReader } from "./outlines";
import { scaleToMm, type IpcScale } from "./scale";
import { AccessBook } from "./sides";
import { readTestRecord, type RecordContext, type TestRecord } from "./test-record";

const POINTS: Record<number, PointKind> = { 317: "through", 327: "surface", 367: "through", 307: "via" };
const TOOLING = new Set([337, 347]);
const COLUMNS = 80;

/** Takes the lines of one file in their order and gathers what they say. */
export class IpcReader {
  readonly passedOver = new LineNotes();
  readonly warnings = new LineNotes();
  readonly header = new IpcHeader((line, reason) => this.warnings.add(line, reason));
  readonly nets = new NetCollector();
  readonly access = new AccessBook();
  readonly toolingHoles: ToolingHole[] = [];
  readonly outlines = new OutlineReader();
  readonly neighbours = new NeighbourReader();
  /** Records that were counted, not kept. */
  readonly counts = new Map<string, number>();
  /** Line of the end record; 0: none yet. */
  endLine = 0;
  private readonly context: RecordContext;
  private scale: IpcScale | undefined;
  /** The point that a continuation continues. */
  private last: NetPoint | undefined;

  /** `ownScale` stands above what the header says. */
  constructor(private readonly ownScale: IpcScale | undefined) {
    const warn = (reason: string) => this.warnings.add(this.context.line, reason);
    this.context = { line: 0, toMm: (value) => value, isInDegrees: true, warn };
  }

  /** Without its line end and without blanks behind. */
  take(whole: string, number: number): void {
    if (whole === "" || whole === "\u001a") return;
    if (this.endLine > 0) {
      this.passedOver.add(number, `Stands after the end of the data in line ${this.endLine}.`);
      return;
    }
    if (whole.length > COLUMNS) {
      this.warnings.add(number, `The line has more than ${COLUMNS} columns; what stands beyond them is passed over.`);
    }
    const line = whole.length > COLUMNS ? whole.slice(0, COLUMNS) : whole;
    const first = line.charAt(0);
    if (first === "P" || first === "C") this.header.take(line, number);
    else this.takeRecord(line, number);
  }

  private takeRecord(line: string, number: number): void {
    const code = line.length < 3 ? Number.NaN : digitsAt(line, 0, 3);
    this.useUnits(number);
    const kind = code === undefined ? undefined : POINTS[code];
    if (code === undefined || Number.isNaN(code)) {
      this.passedOver.add(number, "Begins with neither P, C nor an operation code.");
    } else if (kind !== undefined) this.takePoint(line, kind, code === 307);
    else if (code === 17 || code === 27) this.takeContinuation(line);
    else if (TOOLING.has(code)) this.takeTooling(line);
    else if (code === 379) this.neighbours.begin(line, number);
    else if (code === 79) this.passOver(this.neighbours.goOn(line, number));
    else if (code === 389) this.passOver(this.outlines.begin(line, this.context.toMm));
    else if (code === 89) this.passOver(this.outlines.goOn(line, this.context.toMm));
    else if (code === 999) this.endLine = number;
    else this.takeOther(line, code);
  }

  private takePoint(line: string, kind: PointKind, isBuried: boolean): void {
    this.last = undefined;
    if (this.header.isInPanel) return this.passOver("Belongs to the panel, not to the board.");
    const record = readTestRecord(line, kind, this.context);
    if (typeof record === "string") return this.passOver(record);
    if (isBuried) record.point.kind = "via";
    this.last = record.point;
    this.access.add(record.point, isBuried ? buriedAccess(line) : record.access);
    this.nets.add(record.net, record.point);
  }

  private takeContinuation(line: string): void {
    if (!this.last) return this.passOver("Continues a point that was passed over.");
    const record = readTestRecord(line, "through", this.context);
    if (typeof record === "string") return this.passOver(record);
    joinRecord(this.last, record.point);
    this.access.join(record.access);
    this.count("continuations of a point");
  }

  private takeTooling(line: string): void {
    const record: TestRecord | string = readTestRecord(line, "through", this.context);
    if (typeof record === "string") return this.passOver(record);
    const { xMm, yMm, holeMm } = record.point;
    if (xMm === null || yMm === null) return this.passOver("A tooling hole or mark without a place.");
    this.toolingHoles.push({ xMm, yMm, holeMm, line: this.context.line });
  }

  private takeOther(line: string, code: number): void {
    const what = NOT_KEPT[code];
    if (what === undefined) this.passOver(`${line.slice(0, 3)} is no operation code of this format.`);
    else this.count(what);
  }

  private useUnits(line: number): void {
    this.context.line = line;
    this.context.isInDegrees = this.header.units.isInDegrees;
    const scale = this.ownScale ?? this.header.units.scale;
    if (scale === this.scale) return;
    this.scale = scale;
    this.context.toMm = scaleToMm(scale);
  }

  private count(what: string): void {
    this.counts.set(what, (this.counts.get(what) ?? 0) + 1);
  }

  private passOver(reason: string | undefined): void {
    if (reason !== undefined) this.passedOver.add(this.context.line, reason);
  }
}

/** First and last layer of a blind or buried via, columns 75 … 80: it is reached from the outer one, if it has one. */
function buriedAccess(line: string): number | undefined {
  const [, first, last] = /^L(\d\d)L(\d\d)$/.exec(line.slice(74)) ?? [];
  return first === undefined ? undefined : Number(first) === 1 ? 1 : Number(last);
}
