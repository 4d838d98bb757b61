/** A directed graph whose edges cost something to cut; nodes and edges are numbered from 0. */
export interface CutGraph {
  readonly count: number;
  readonly from: Int32Array;
  readonly to: Int32Array;
  readonly cost: Float64Array;
  /** Edges out of node i: outEdge[outStart[i]] … ; into it likewise. */
  readonly outStart: Int32Array;
  readonly outEdge: Int32Array;
  readonly inStart: Int32Array;
  readonly inEdge: Int32Array;
}

export interface Edge {
  readonly from: number;
  readonly to: number;
  readonly cost: number;
}

export function cutGraph(count: number, edges: readonly Edge[]): CutGraph {
  const from = Int32Array.from(edges, (edge) => edge.from);
  const to = Int32Array.from(edges, (edge) => edge.to);
  const cost = Float64Array.from(edges, (edge) => edge.cost);
  const [outStart, outEdge] = grouped(count, from);
  const [inStart, inEdge] = grouped(count, to);
  return { count, from, to, cost, outStart, outEdge, inStart, inEdge };
}

function grouped(count: number, key: Int32Array): [Int32Array, Int32Array] {
  const start = new Int32Array(count + 1);
  for (const node of key) start[node + 1]!++;
  for (let i = 0; i < count; i++) start[i + 1]! += start[i]!;
  const next = start.slice();
  const edges = new Int32Array(key.length);
  for (let edge = 0; edge < key.length; edge++) edges[next[key[edge]!]!++] = edge;
  return [start, edges];
}

/** Work still allowed, counted in edges looked at: the same on every machine, as a clock would not be. */
export interface Budget {
  left: number;
}

/** Shortest ways through a graph, by breadth; its arrays are made once and used for every search. */
export class Walker {
  private readonly seen: Int32Array;
  private readonly by: Int32Array;
  private readonly queue: Int32Array;
  private round = 0;

  constructor(private readonly graph: CutGraph) {
    this.seen = new Int32Array(graph.count);
    this.by = new Int32Array(graph.count);
    this.queue = new Int32Array(graph.count);
  }

  /**
   * Edges of a shortest way between two different nodes that goes round the `removed` edges and has at most
   * `longest` edges; null where there is none.
   */
  way(from: number, to: number, removed: Uint8Array, longest: number, budget: Budget): number[] | null {
    const { outStart, outEdge, to: target } = this.graph;
    const round = ++this.round;
    let filled = 0;
    this.queue[filled++] = from;
    this.seen[from] = round;
    let levelEnd = filled;
    let level = 1;
    for (let k = 0; k < filled; k++) {
      if (k === levelEnd) {
        levelEnd = filled;
        level++;
      }
      if (level > longest) return null;
      const node = this.queue[k]!;
      const end = outStart[node + 1]!;
      budget.left -= end - outStart[node]!;
      for (let p = outStart[node]!; p < end; p++) {
        const edge = outEdge[p]!;
        const next = target[edge]!;
        if (removed[edge] === 1 || this.seen[next] === round) continue;
        this.seen[next] = round;
        this.by[next] = edge;
        if (next === to) return this.trace(from, to);
        this.queue[filled++] = next;
      }
    }
    return null;
  }

  private trace(from: number, to: number): number[] {
    const edges: number[] = [];
    for (let node = to; node !== from; node = this.graph.from[this.by[node]!]!) edges.push(this.by[node]!);
    return edges.reverse();
  }
}
