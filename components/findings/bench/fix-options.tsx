'use client';

import { useId, type ReactNode } from 'react';
import { StateWord } from '@/components/ui/state-word';
import { fixesOf } from '@/lib/client/findings';
import type { SheetRowsView } from '@/lib/contract/sheet-rows';
import type { Figures, FindingView } from '@/lib/contract/submission';
import { EditsText } from './edits-text';
import { EffectLine } from './effect-line';
import { BY_HAND } from './fix-choice';

interface FixOptionsProps {
  finding: FindingView;
  piece: SheetRowsView | undefined;
  now: Figures;
  option: string;
  onOption: (option: string) => void;
  /** Null where there is no single cell that could be edited, or the role may not. */
  byHand: ReactNode;
}

/** What can be done about a finding, as a list of which one is chosen. */
export function FixOptions({ finding, piece, now, option, onOption, byHand }: FixOptionsProps) {
  const group = useId();
  return (
    <div role="radiogroup" aria-label="Fix">
      {fixesOf(finding).map((fix) => (
        <Option
          key={fix.id}
          group={group}
          value={fix.id}
          chosen={option}
          onChoose={onOption}
          below={<EffectLine finding={finding} fix={fix} piece={piece} now={now} />}
        >
          <span className="block">
            {fix.reason} {fix.state !== 'proposed' && <StateWord state={fix.state} />}
          </span>
          <EditsText edits={fix.edits} />
        </Option>
      ))}
      {byHand && (
        <>
          <Option group={group} value={BY_HAND} chosen={option} onChoose={onOption}>
            Other values …
          </Option>
          {option === BY_HAND && <div className="pb-3 pl-6">{byHand}</div>}
        </>
      )}
    </div>
  );
}

interface OptionProps {
  group: string;
  value: string;
  chosen: string;
  onChoose: (value: string) => void;
  /** Stands under the label and is no part of it: what can be opened must not choose. */
  below?: ReactNode;
  children: ReactNode;
}

function Option({ group, value, chosen, onChoose, below, children }: OptionProps) {
  return (
    <div className="border-b border-hair py-2 last:border-0">
      <label className="flex cursor-pointer gap-2">
        <input
          type="radio"
          name={group}
          value={value}
          checked={chosen === value}
          onChange={() => onChoose(value)}
          className="mt-1 size-3.5 shrink-0 accent-cord"
        />
        <span className="min-w-0 flex-1">{children}</span>
      </label>
      {below && <div className="pl-5.5">{below}</div>}
    </div>
  );
}
