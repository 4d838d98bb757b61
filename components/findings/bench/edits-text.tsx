import type { CellEditView } from '@/lib/contract/submission';
import { pieceOf } from '../edit-text';
import { PieceText } from '../piece-text';

/** As many edits as are spelt out; the rest are counted. */
const SPELT_OUT = 4;

/** "G23 6 → 4  H23 4 → 6". */
export function EditsText({ edits }: { edits: readonly CellEditView[] }) {
  const more = edits.length - SPELT_OUT;
  return (
    <span className="block">
      {edits.slice(0, SPELT_OUT).map((edit) => (
        <span key={`${edit.sheet} ${edit.cell}`} className="mr-3 inline-block">
          <span className="text-slate">{edit.cell}</span> <PieceText piece={pieceOf(edit)} />
        </span>
      ))}
      {more > 0 && (
        <span className="text-slate">
          and {more} more {more === 1 ? 'cell' : 'cells'}
        </span>
      )}
    </span>
  );
}
