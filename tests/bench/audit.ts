import { runAudit } from '@/lib/audit';
import { compile } from '@/lib/network';
import type { ActivityList } from '@/lib/schedule/activity-list';
import { list } from '@/tests/support/networks';
import { measure, type BenchRow } from './measure';

/** A list with 2.5 links an activity and a defect on every eighth row, of ten kinds. */
function makeList(size: number): ActivityList {
  return list(...Array.from({ length: size }, (_, index) => row(index + 1)));
}

function row(number: number): string {
  const likely = 2 + ((number * 7) % 19);
  const before = [1, 3, 11].map((back) => number - back).filter((other) => other > 0);
  const links = before.slice(0, 2 + (number % 2)).map((other) => `T-${other}`);
  const clean = [`T-${number}`, `${likely - 1} ${likely} ${likely * 2}`, links.join(', ')] as const;
  const [id, numbers, after] = number % 8 === 0 ? broken(number, clean) : clean;
  return `${id} "Work package ${number}" ${numbers}${after === '' ? '' : ` <- ${after}`}`;
}

type Parts = readonly [string, string, string];

function broken(number: number, [id, numbers, links]: Parts): Parts {
  const [a = '1', m = '2', b = '3'] = numbers.split(' ');
  const kinds: readonly Parts[] = [
    [id, `${m} ${a} ${b}`, links],
    [id, `${a} ${b} ${m}`, links],
    [id, `${a}0 ${m} ${b}`, links],
    [id, `${a} -${m} ${b}`, links],
    [id, `${a} - ${b}`, links],
    [id, numbers, `${links}, t-${number - 4}`],
    [id, numbers, `${links}, T-${number - 4}x`],
    [id, numbers, `${links}, ${id}`],
    [id, numbers, links.split(', ').slice(0, 1).concat(links).join(', ')],
    [id, numbers, ''],
  ];
  return kinds[(number / 8) % kinds.length] ?? [id, numbers, links];
}

/** The audit of a list of each size, the network at hand as in the service. */
export async function benchAudit(sizes: readonly number[]): Promise<BenchRow[]> {
  const rows: BenchRow[] = [];
  for (const size of sizes) {
    const received = makeList(size);
    const network = compile(received);
    rows.push(await measure('audit', size, () => runAudit({ ...received }, network)));
  }
  return rows;
}
