'use client';

import { useId, type ReactNode } from 'react';
import { StateWord } from '@/components/ui/state-word';
import { fixesOf } from '@/lib/client/findings';
import type { SheetRowsView } from '@/lib/contract/sheet-rows';
import type { FindingView, FixView } from '@/lib/contract/submission';
import { pieceOf } from '../edit-text';
import { PieceText } from '../piece-text';
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
          <EditsText fix={fix} />
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

/** As many edits as are spelt out; the rest are counted. */
const SPELT_OUT = 4;

function EditsText({ fix }: { fix: FixView }) {
  const more = fix.edits.length - SPELT_OUT;
  return (
    <span className="block">
      {fix.edits.slice(0, SPELT_OUT).map((edit) => (
        <span key={`${edit.sheet} ${edit.cell}`} className="mr-3 inline-block">
          <span className="text-slate">{edit.cell}</span> <PieceText piece={pieceOf(edit)} />
        </span>
      ))}
      {more > 0 && <span className="text-slate">and {more} more cells</span>}
    </span>
  );
}
