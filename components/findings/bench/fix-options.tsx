'use client';

import { useId, type ReactNode } from 'react';
import { StateWord } from '@/components/ui/state-word';
import { fixesOf } from '@/lib/client/findings';
import type { SheetRowsView } from '@/lib/contract/sheet-rows';
import type { FindingView } from '@/lib/contract/submission';
import { EditsText } from './edits-text';
import { EffectLine } from './effect-line';
import { BY_HAND } from './fix-choice';

interface FixOptionsProps {
  finding: FindingView;
  piece: SheetRowsView | undefined;
  option: string;
  onOption: (option: string) => void;
  /** Null where there is no single cell that could be edited, or the role may not. */
  byHand: ReactNode;
}

/** What can be done about a finding, as a list of which one is chosen. */
export function FixOptions({ finding, piece, option, onOption, byHand }: FixOptionsProps) {
  const group = useId();
  return (
    <div role="radiogroup" aria-label="Fix">
      {fixesOf(finding).map((fix) => (
        <Option key={fix.id} group={group} value={fix.id} chosen={option} onChoose={onOption}>
          <span className="block">
            {fix.reason} {fix.state !== 'proposed' && <StateWord state={fix.state} />}
          </span>
          <EditsText edits={fix.edits} />
          <EffectLine finding={finding} fix={fix} piece={piece} />
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

function Option({
  group,
  value,
  chosen,
  onChoose,
  children,
}: {
  group: string;
  value: string;
  chosen: string;
  onChoose: (value: string) => void;
  children: ReactNode;
}) {
  return (
    <label className="flex cursor-pointer gap-2 border-b border-hair py-2 last:border-0">
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
  );
}
