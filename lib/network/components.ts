/** Edges of node i: positions start[i] … start[i + 1] − 1 of `target`. */
export interface OutEdges {
  readonly count: number;
  readonly start: Int32Array;
  readonly target: Int32Array;
}

/**
 * Strongly connected components of two or more nodes, nodes ascending, components by their first node.
 * Linear and without recursion; self-edges do not matter.
 *
 * Source: Tarjan, "Depth-First Search and Linear Graph Algorithms", SIAM Journal on Computing 1 (1972).
 */
export function tangledComponents({ count, start, target }: OutEdges): number[][] {
  const components: number[][] = [];
  // 0 while unseen, then the order of discovery; `count + 1` once its component is closed.
  const seen = new Int32Array(count);
  const low = new Int32Array(count);
  const cursor = start.slice(0, count);
  const path = new Int32Array(count);
  const open = new Int32Array(count);
  const closed = count + 1;
  let discovered = 0;
  let pathLength = 0;
  let openLength = 0;
  for (let root = 0; root < count; root++) {
    if (seen[root] !== 0) continue;
    path[pathLength++] = root;
    while (pathLength > 0) {
      const node = path[pathLength - 1]!;
      if (seen[node] === 0) {
        seen[node] = low[node] = ++discovered;
        open[openLength++] = node;
      }
      const edge = cursor[node]!;
      if (edge < start[node + 1]!) {
        cursor[node] = edge + 1;
        const next = target[edge]!;
        if (seen[next] === 0) path[pathLength++] = next;
        else if (seen[next]! < low[node]!) low[node] = seen[next]!;
        continue;
      }
      pathLength--;
      if (low[node] === seen[node]) {
        let first = openLength;
        do {
          seen[open[--first]!] = closed;
        } while (open[first] !== node);
        if (openLength - first > 1) components.push(Array.from(open.subarray(first, openLength)));
        openLength = first;
      }
      if (pathLength > 0) {
        const parent = path[pathLength - 1]!;
        if (low[node]! < low[parent]! && seen[node] !== closed) low[parent] = low[node]!;
      }
    }
  }
  for (const component of components) component.sort((a, b) => a - b);
  return components.sort((a, b) => a[0]! - b[0]!);
}
