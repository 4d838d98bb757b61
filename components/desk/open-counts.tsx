import { useFormat } from '@/components/ui/locale';
import { WeightMark } from '@/components/ui/weight-mark';
import { WEIGHTS, type Weight } from '@/lib/schedule/weight';

const ORDER = Object.keys(WEIGHTS) as Weight[];

/** Open findings by weight: shape, word, number; weights without any are left out. */
export function OpenCounts({ open }: { open: Readonly<Record<Weight, number>> }) {
  const format = useFormat();
  const shown = ORDER.filter((weight) => open[weight] > 0);
  if (shown.length === 0) return <p className="text-slate">none open</p>;
  return (
    <ul className="flex flex-wrap content-start gap-x-4 gap-y-1">
      {shown.map((weight) => (
        <li key={weight} className="whitespace-nowrap">
          <WeightMark weight={weight} /> {format.count(open[weight])}
        </li>
      ))}
    </ul>
  );
}
