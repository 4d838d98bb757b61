import { WEIGHTS, type Weight } from '@/lib/schedule/weight';
import { classes } from './classes';

const COLOURS: Record<Weight, string> = { blocks: 'text-umber', distorts: 'text-brass', query: 'text-slate' };

/** ■ blocks, ◧ distorts, □ query: a shape and the word beside every colour. */
export function WeightMark({ weight, bare = false }: { weight: Weight; bare?: boolean }) {
  return (
    <span
      className={classes('inline-flex items-baseline gap-1 font-semibold whitespace-nowrap', COLOURS[weight])}
      title={`${weight}: ${WEIGHTS[weight]}`}
    >
      <WeightSquare weight={weight} />
      {bare ? <span className="sr-only">{weight}</span> : weight}
    </span>
  );
}

/** The shape alone, in the current colour; always beside its word. */
function WeightSquare({ weight }: { weight: Weight }) {
  return (
    <svg viewBox="0 0 10 10" width="10" height="10" aria-hidden="true" className="relative top-px shrink-0">
      <rect x="0.75" y="0.75" width="8.5" height="8.5" fill="none" stroke="currentColor" strokeWidth="1.5" />
      {weight !== 'query' && (
        <rect x="0" y="0" width={weight === 'blocks' ? 10 : 5} height="10" fill="currentColor" />
      )}
    </svg>
  );
}
