import type { CustomCellRendererProps } from 'ag-grid-react';
import type { FindingView } from '@/lib/contract/submission';
import { adoptedFix } from '@/lib/client/findings';
import { classes } from '@/components/ui/classes';
import { StateWord } from '@/components/ui/state-word';
import { WeightMark } from '@/components/ui/weight-mark';
import { summariseEdits } from '../edit-text';
import { PieceText } from '../piece-text';
import { aboutText, placeText } from '../place-text';
import type { GridContext } from './context';
import { effectText, messageText, sideNotes } from './texts';

type CellProps = CustomCellRendererProps<FindingView, unknown, GridContext>;

export function WeightCell({ data }: CellProps) {
  return data ? <WeightMark weight={data.weight} /> : null;
}

export function PlaceCell({ data, context }: CellProps) {
  return data ? placeText(data, context.severalSheets) : null;
}

export function AboutCell({ data }: CellProps) {
  return data ? <Clamped>{aboutText(data)}</Clamped> : null;
}

export function MessageCell({ data }: CellProps) {
  return data ? <Clamped>{messageText(data)}</Clamped> : null;
}

/** Where there is no column for the activity, it stands above what is wrong with it. */
export function AboutAndMessageCell({ data }: CellProps) {
  if (!data) return null;
  return (
    <>
      <span className="block truncate font-semibold">{aboutText(data)}</span>
      <Clamped>{messageText(data)}</Clamped>
    </>
  );
}

export function FixCell({ data }: CellProps) {
  return data ? <FixSummaryText finding={data} /> : null;
}

export function EffectCell({ data, context }: CellProps) {
  return data ? effectText(data, context.format) : null;
}

export function StateCell({ data }: CellProps) {
  if (!data) return null;
  return (
    <>
      <FindingStateWord finding={data} />
      {sideNotes(data).map((note) => (
        <span key={note} className="block truncate text-slate">
          {note}
        </span>
      ))}
    </>
  );
}

/** All of a finding in one column, for narrow screens. */
export function CardCell({ data, context }: CellProps) {
  if (!data) return null;
  const effect = effectText(data, context.format);
  return (
    <div className="py-1">
      <div className="flex flex-wrap items-center gap-x-3">
        <WeightMark weight={data.weight} />
        <span>{placeText(data, context.severalSheets)}</span>
        <span className="ml-auto">
          <FindingStateWord finding={data} />
        </span>
      </div>
      <div className="truncate font-semibold">{aboutText(data)}</div>
      <Clamped>{messageText(data)}</Clamped>
      <div className="flex justify-between gap-3">
        <span className="min-w-0 truncate">
          <FixSummaryText finding={data} />
        </span>
        {effect !== '–' && <span className="whitespace-nowrap">{effect}</span>}
      </div>
    </div>
  );
}

/** What is open is the rule; what is settled stands out. */
function FindingStateWord({ finding: { state } }: { finding: FindingView }) {
  return state === 'open' ? 'open' : <StateWord state={state} />;
}

function FixSummaryText({ finding }: { finding: FindingView }) {
  const fix = adoptedFix(finding) ?? finding.fix;
  const summary = summariseEdits(fix?.edits ?? []);
  if (summary.kind === 'none') return <span className="text-slate">none</span>;
  if (summary.kind === 'count') return summary.text;
  return (
    <span className={classes(fix?.state === 'declined' && 'opacity-70')}>
      {summary.pieces.map((piece, index) => (
        <span key={index}>
          {index > 0 && ' · '}
          <PieceText piece={piece} />
        </span>
      ))}
    </span>
  );
}

/** As many lines as the row has room for; the bench shows the whole. */
function Clamped({ children }: { children: string }) {
  return <span className="line-clamp-3">{children}</span>;
}
