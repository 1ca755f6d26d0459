import type { Net, NetPoint } from "./netlist";

/** Gathers points by net, in the order in which the nets come. */
export class NetCollector {
  readonly unconnected: NetPoint[] = [];
  private readonly nets = new Map<string, Net>();
  private last: Net = { name: "", points: [] };

  /** An empty name: no net. */
  add(name: string, point: NetPoint): void {
    if (name === "") this.unconnected.push(point);
    else this.net(name).points.push(point);
  }

  has = (name: string): boolean => this.nets.has(name);

  /** Under their full names; nets of one name become one. */
  finish(fullName: (name: string) => string = (name) => name): Net[] {
    const renamed = new Map<string, Net>();
    for (const { name, points } of this.nets.values()) {
      const full = fullName(name);
      const same = renamed.get(full);
      if (same) for (const point of points) same.points.push(point);
      else renamed.set(full, { name: full, points });
    }
    return [...renamed.values()];
  }

  /** Points of one net mostly follow each other. */
  private net(name: string): Net {
    if (this.last.name === name) return this.last;
    let net = this.nets.get(name);
    if (!net) {
      net = { name, points: [] };
      this.nets.set(name, net);
    }
    this.last = net;
    return net;
  }
}
