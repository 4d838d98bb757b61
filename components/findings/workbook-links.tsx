'use client';

import { ButtonAnchor } from '@/components/ui/button';
import { useFormat } from '@/components/ui/locale';
import { workbookPath } from '@/lib/client/submissions';
import type { SubmissionView } from '@/lib/contract/submission';

/** The contractor's own file, with the corrected cells changed, or as it came. */
export function WorkbookLinks({ office, view }: { office: string; view: SubmissionView }) {
  const format = useFormat();
  const received = workbookPath(office, view.id, 'received');
  if (view.corrections === 0) {
    return (
      <p className="flex flex-wrap items-center gap-x-3 text-slate">
        <span>Nothing is corrected yet.</span>
        <ButtonAnchor variant="ghost" href={received} download>
          File as received
        </ButtonAnchor>
      </p>
    );
  }
  return (
    <p className="flex flex-wrap items-center gap-x-3 gap-y-2">
      <a href={received} download>
        As received
      </a>
      <ButtonAnchor
        variant="ghost"
        href={workbookPath(office, view.id, 'corrected')}
        download
        title={`${view.file.name} with ${format.plural(view.corrections, 'correction', 'corrections')}, each marked`}
      >
        Corrected workbook
      </ButtonAnchor>
    </p>
  );
}
