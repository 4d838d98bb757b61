import type { ReactNode } from 'react';
import { WorkedLine, type Working } from './worked-line';

export interface TwoStateFigureProps {
  label: ReactNode;
  /** Already formatted, or null where that state cannot be computed. */
  received: string | null;
  corrected: string | null;
  /** With sign and unit, and what else belongs on the last line. */
  difference?: ReactNode;
  /** Opens at the corrected figure. */
  working?: Working | undefined;
  /** Opens at the figure as received. */
  receivedWorking?: Working | undefined;
}

/** Label, as received, arrow, as corrected, difference. Belongs into a `<dl>`. */
export function TwoStateFigure({
  label,
  received,
  corrected,
  difference,
  working,
  receivedWorking,
}: TwoStateFigureProps) {
  const same = received === corrected;
  return (
    <div className="min-w-0">
      <dt className="text-slate">{label}</dt>
      <dd className="text-base">
        {!same && (
          <>
            <span className="sr-only">As received </span>
            <del className="was">{figure(received, receivedWorking)}</del>
            <span aria-hidden="true"> → </span>
            <span className="sr-only">, as corrected </span>
          </>
        )}
        <ins className={same ? 'font-semibold no-underline' : 'now no-underline'}>
          {figure(corrected, working)}
        </ins>
      </dd>
      {difference && <dd className="text-slate">{difference}</dd>}
    </div>
  );
}

function figure(value: string | null, working: Working | undefined): ReactNode {
  if (value === null) return 'not computable';
  const text = <span className="whitespace-nowrap">{value}</span>;
  return working ? <WorkedLine working={working}>{text}</WorkedLine> : text;
}
