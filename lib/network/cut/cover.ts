import type { Budget } from './graph';

/**
 * The cheapest set of edges that has one in every loop, below the cost `bound`; null where there is none, and
 * `undefined` where the budget ran out before that was settled. Branch and bound: of a loop without a chosen
 * edge, each edge is tried in turn and then barred; the bound is a set of loops that share no edge.
 */
export function cheapestCover(
  loops: readonly (readonly number[])[],
  cost: Float64Array,
  bound: number,
  budget: Budget,
): number[] | null | undefined {
  const through = new Map<number, number[]>();
  loops.forEach((loop, k) => {
    for (const edge of loop) through.set(edge, [...(through.get(edge) ?? []), k]);
  });
  const hits = new Int32Array(loops.length);
  const barred = new Set<number>();
  const chosen: number[] = [];
  const branches: { readonly edges: readonly number[]; next: number }[] = [];
  let spent = 0;
  let best: number[] | null = null;
  let limit = bound;

  const choose = (edge: number, sign: 1 | -1) => {
    spent += sign * cost[edge]!;
    for (const k of through.get(edge) ?? []) hits[k]! += sign;
  };
  const open = () => {
    const state = assess(loops, hits, barred, cost, budget);
    if (spent + state.least >= limit - HALF) return;
    if (state.branch) {
      const value = (edge: number) => (through.get(edge) ?? []).filter((k) => hits[k] === 0).length;
      const edges = state.branch.filter((edge) => !barred.has(edge)).sort((a, b) => value(b) - value(a));
      branches.push({ edges, next: 0 });
    } else {
      best = [...chosen];
      limit = spent;
    }
  };

  open();
  while (branches.length > 0) {
    if (budget.left < 0) return undefined;
    const branch = branches[branches.length - 1]!;
    if (branch.next > 0) {
      const tried = branch.edges[branch.next - 1]!;
      choose(tried, -1);
      chosen.pop();
      barred.add(tried);
    }
    const edge = branch.edges[branch.next];
    if (edge === undefined) {
      for (const tried of branch.edges) barred.delete(tried);
      branches.pop();
      continue;
    }
    branch.next++;
    choose(edge, 1);
    chosen.push(edge);
    open();
  }
  return best;
}

/** Costs are whole numbers: what is less than a half apart is the same. */
const HALF = 0.5;

/** What the loops still without a chosen edge cost at least, and the one of them to branch on. */
function assess(
  loops: readonly (readonly number[])[],
  hits: Int32Array,
  barred: ReadonlySet<number>,
  cost: Float64Array,
  budget: Budget,
): { readonly least: number; readonly branch: readonly number[] | null } {
  const used = new Set<number>();
  let least = 0;
  let branch: readonly number[] | null = null;
  let fewest = Infinity;
  loops.forEach((loop, k) => {
    if (hits[k] !== 0) return;
    budget.left -= loop.length;
    const free = loop.filter((edge) => !barred.has(edge));
    if (free.length < fewest) {
      fewest = free.length;
      branch = loop;
    }
    if (free.some((edge) => used.has(edge))) return;
    for (const edge of free) used.add(edge);
    least += free.reduce((low, edge) => Math.min(low, cost[edge]!), Infinity);
  });
  return { least, branch };
}
