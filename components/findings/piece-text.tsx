import { Change } from '@/components/ui/change';
import type { EditPiece } from './edit-text';

/** What changes in a cell: old struck through, new underlined; what only comes or goes is said in a word. */
export function PieceText({ piece: { was, now } }: { piece: EditPiece }) {
  if (was === null) {
    return (
      <>
        <ins className="now no-underline">{now}</ins> added
      </>
    );
  }
  if (now === null) {
    return (
      <>
        <del className="was">{was}</del> removed
      </>
    );
  }
  return <Change from={was} to={now} />;
}
