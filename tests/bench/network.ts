import { DirectedGraph } from 'graphology';
import { topologicalSort } from 'graphology-dag';
import { analyse, compile, findTangles, prepareEffects } from '@/lib/network';
import { forwardPass, times } from '@/lib/network/passes';
import { plan, startToStart } from '@/lib/network/plan';
import type { ActivityList } from '@/lib/schedule/activity-list';
import type { NetworkChange } from '@/lib/schedule/edit';
import { randomFrom } from '@/tests/support/lists';
import { list } from '@/tests/support/networks';
import { measure, type BenchRow } from './measure';
import { passInC } from './pass-in-c';

const REPEATS = 15;
/** Runs before the first that counts: what is asked for once an upload has been asked for before. */
const WARM_UP = 30;

/** 2.5 links an activity, from among the sixty before it; a share of them the other way round. */
function makeList(size: number, turned = 0): ActivityList {
  const random = randomFrom(7);
  const whole = (below: number) => Math.floor(random() * below);
  const relation = () => (random() < 0.8 ? 'FS' : ['SS', 'FF', 'SF'][whole(3)]);
  const rows = Array.from({ length: size }, (_, index) => {
    const links = Array.from({ length: index === 0 ? 0 : 1 + whole(4) }, () => {
      const away = 1 + whole(60);
      const other = random() < turned ? Math.min(size - 1, index + away) : Math.max(0, index - away);
      return `N${other} ${relation()}+${random() < 0.5 ? 0 : whole(5)}`;
    });
    const likely = 2 + whole(20);
    const row = `N${index} ${Math.max(1, likely - 3)} ${likely} ${likely + 2 + whole(8)}`;
    return links.length > 0 ? `${row} <- ${links.join(', ')}` : row;
  });
  return list(...rows);
}

/** What an audit proposes, of each kind: other estimates, a link removed, replaced, of another lag. */
function makeFixes({ activities, links }: ActivityList): NetworkChange[][] {
  const random = randomFrom(11);
  const whole = (below: number) => Math.floor(random() * below);
  return activities.flatMap(({ index, likely }): NetworkChange[][] => {
    const m = likely.days ?? 0;
    const link = whole(links.length);
    const after = Math.max(0, index - 1 - whole(60));
    switch (index % 20) {
      case 0:
        return [
          [
            {
              kind: 'estimates',
              activity: index,
              optimistic: m / 2,
              likely: m,
              pessimistic: m * (1 + whole(3)),
            },
          ],
        ];
      case 5:
        return [[{ kind: 'remove-link', link }]];
      case 10:
        return [[{ kind: 'change-lag', link, lag: whole(10) }]];
      case 15:
        return [
          [
            { kind: 'remove-link', link },
            { kind: 'add-link', from: after, to: index, type: 'FS', lag: 0 },
          ],
        ];
      default:
        return [];
    }
  });
}

function buildAndPass(activities: ActivityList): void {
  const ordered = plan(compile(activities));
  if (ordered) times(ordered, forwardPass(ordered));
}

/** The same by the independent package: its graph, its order, both passes and the floats over its edges. */
function withGraphology(activities: ActivityList): void {
  const { expected } = compile({ activities: activities.activities, links: [] });
  const days = (index: number) => expected[index] ?? 0;
  const graph = new DirectedGraph<{ early: number; late: number; free: number }, { weight: number }>();
  for (const { index } of activities.activities)
    graph.addNode(index, { early: 0, late: Infinity, free: Infinity });
  for (const { fromIndex, toIndex, type, lag } of activities.links) {
    const code = ['FS', 'SS', 'FF', 'SF'].indexOf(type);
    const weight = startToStart(code, lag, days(fromIndex), days(toIndex));
    graph.updateEdge(fromIndex, toIndex, (before) => ({
      weight: Math.max(before.weight ?? -Infinity, weight),
    }));
  }
  const order = topologicalSort(graph);
  let finish = 0;
  for (const node of order) {
    const { early } = graph.getNodeAttributes(node);
    finish = Math.max(finish, early + days(Number(node)));
    graph.forEachOutEdge(node, (_, { weight }, _from, to, _source, target) => {
      if (early + weight > target.early) graph.setNodeAttribute(to, 'early', early + weight);
    });
  }
  for (const node of order.reverse()) {
    const { early } = graph.getNodeAttributes(node);
    let late = finish - days(Number(node));
    let free = late - early;
    graph.forEachOutEdge(node, (_, { weight }, _from, _to, _source, target) => {
      late = Math.min(late, target.late - weight);
      free = Math.min(free, target.early - weight - early);
    });
    graph.mergeNodeAttributes(node, { late, free });
  }
}

const SWEEP = new Float64Array(8 * 1024 * 1024);

/** Fills the processor's caches with something else: after an upload the list lies in memory, not in them. */
function sweepCaches(): void {
  for (let k = 0; k < SWEEP.length; k += 8) SWEEP[k] = (SWEEP[k] ?? 0) + 1;
}

/** The network at each size: what it costs, beside an independent package and, where a compiler is there, plain C. */
export async function benchNetwork(sizes: readonly number[]): Promise<BenchRow[]> {
  const rows: BenchRow[] = [];
  const small = makeList(2000);
  for (let k = 0; k < WARM_UP; k++) buildAndPass(small);
  for (const size of sizes) {
    const activities = makeList(size);
    const network = compile(activities);
    const ours = await measure(
      'network: compile, order, passes',
      size,
      () => buildAndPass(activities),
      REPEATS,
    );
    const theirs = await measure('graphology-dag: the same', size, () => withGraphology(activities));
    rows.push({ ...ours, ratio: { to: 'graphology-dag', times: theirs.ms / ours.ms } }, theirs);
    const limit = passInC(network);
    if (limit !== null) {
      const ratio = { to: 'the network here', times: ours.ms / limit };
      rows.push({ name: 'plain C: order, passes', size, ms: limit, peakMb: 0, ratio });
    }
    const cold = () => analyse(compile(activities));
    rows.push(await measure('network: all of it, caches cold', size, cold, REPEATS, sweepCaches));
    rows.push(await measure('network: compile', size, () => compile(activities), REPEATS));
    rows.push(await measure('network: analyse (all figures)', size, () => analyse(network), REPEATS));

    const tangled = compile(makeList(size, 0.01));
    rows.push(await measure('network: tangles, 1 % turned links', size, () => findTangles(tangled), REPEATS));

    const fixes = makeFixes(activities);
    const eachFix = () => {
      const effects = prepareEffects(network);
      for (const changes of fixes) effects.effect(changes);
    };
    rows.push(await measure('network: effects, a fix on each 5th', size, eachFix));
  }
  return rows;
}
