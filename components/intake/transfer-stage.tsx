'use client';

import { Button } from '@/components/ui/button';
import { useFormat } from '@/components/ui/locale';
import { Panel } from '@/components/ui/panel';
import { Progress } from '@/components/ui/progress';

interface Props {
  file: File;
  share: number;
  doing: 'reading' | 'sending';
  onCancel: () => void;
}

const AFTER = {
  reading: 'It has arrived; the sheets are being looked through.',
  sending: 'It has arrived; the rows are read, the audit runs, and the network is computed.',
};

/** A file on its way: how much has left, then what the server does with it. */
export function TransferStage({ file, share, doing, onCancel }: Props) {
  const format = useFormat();
  const sent = share < 1;
  const words = sent
    ? `${format.bytes(share * file.size)} of ${format.bytes(file.size)} sent.`
    : AFTER[doing];
  return (
    <Panel
      title={`${doing === 'reading' ? 'Reading' : 'Handing in'} “${file.name}”`}
      bench
      className="mx-auto max-w-3xl"
    >
      <Progress label={words} share={sent ? share : null} />
      <Button variant="ghost" className="mt-4" onClick={onCancel}>
        Cancel
      </Button>
    </Panel>
  );
}
