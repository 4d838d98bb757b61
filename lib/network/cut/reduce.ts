import type { CutGraph } from './graph';

/** An edge of the reduced graph: to cut it is to cut these edges of the graph it came from. */
interface Piece {
  readonly cost: number;
  readonly cuts: readonly number[];
}

export interface ReducedEdge extends Piece {
  readonly from: number;
  readonly to: number;
}

export interface Reduced {
  /** Edges that some smallest cut contains whatever else it does. */
  readonly forced: number[];
  /** What is left to decide; nodes keep their numbers. */
  readonly edges: ReducedEdge[];
}

/**
 * Makes the question smaller without changing its answer. A node with one way in and one way out is passed
 * through: the cheaper of the two stands for both; two edges of one pair are cut together or not at all; an
 * edge that has come back to its own start must be cut. Chains of work, most of any tangle, vanish this way.
 */
export function reduce(graph: CutGraph): Reduced {
  const forced: number[] = [];
  const out = Array.from({ length: graph.count }, () => new Map<number, Piece>());
  const into = Array.from({ length: graph.count }, () => new Set<number>());
  const connect = (from: number, to: number, piece: Piece) => {
    if (from === to) {
      forced.push(...piece.cuts);
      return;
    }
    const beside = out[from]!.get(to);
    const both = beside && { cost: beside.cost + piece.cost, cuts: [...beside.cuts, ...piece.cuts] };
    out[from]!.set(to, both ?? piece);
    into[to]!.add(from);
  };
  for (let edge = 0; edge < graph.from.length; edge++) {
    connect(graph.from[edge]!, graph.to[edge]!, { cost: graph.cost[edge]!, cuts: [edge] });
  }
  const waiting = Array.from({ length: graph.count }, (_, node) => node);
  const remove = (node: number) => {
    for (const to of out[node]!.keys()) {
      into[to]!.delete(node);
      waiting.push(to);
    }
    for (const from of into[node]!) {
      out[from]!.delete(node);
      waiting.push(from);
    }
    out[node]!.clear();
    into[node]!.clear();
  };
  for (let node = waiting.pop(); node !== undefined; node = waiting.pop()) {
    const ways = out[node]!;
    const [from, second] = into[node]!;
    const [way] = ways;
    if (from === undefined || way === undefined) {
      remove(node);
    } else if (second === undefined && ways.size === 1) {
      const [to, leaving] = way;
      const entering = out[from]!.get(node) ?? leaving;
      remove(node);
      connect(from, to, entering.cost < leaving.cost ? entering : leaving);
    }
  }
  const edges = out.flatMap((ways, from) => [...ways].map(([to, piece]) => ({ from, to, ...piece })));
  return { forced, edges };
}
