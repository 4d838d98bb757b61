'use client';

import { Button } from '@/components/ui/button';
import { DropZone } from './drop-zone';
import type { Stage } from './use-intake';

interface Props {
  stage: Extract<Stage, { at: 'choose' }>;
  again: boolean;
  onFile: (file: File) => void;
  onRefused: (sentence: string) => void;
}

export function ChooseStage({ stage, again, onFile, onRefused }: Props) {
  const { file, trouble } = stage;
  return (
    <div className="mx-auto flex max-w-3xl flex-col gap-4">
      {trouble && (
        <div role="alert" className="border border-l-4 border-hair border-l-umber bg-leaf p-4">
          <p className="text-base font-semibold">
            {file ? `“${file.name}” was not taken in` : 'Nothing was taken in'}
          </p>
          <p className="max-w-prose">{trouble.sentence}</p>
          <p className="text-slate">The project is as it was.</p>
          {file && (
            <Button variant="ghost" className="mt-3" onClick={() => onFile(file)}>
              Try this file again
            </Button>
          )}
        </div>
      )}
      {again && !trouble && (
        <p className="border border-l-4 border-hair border-l-cord bg-leaf p-3">
          The file is no longer in this browser’s memory. Choose it once more, and set its columns.
        </p>
      )}
      <DropZone onFile={onFile} onRefused={onRefused}>
        <p className="max-w-prose text-slate">
          It holds a row for each activity: an ID, what it waits for, and three guesses of how long it takes,
          or one duration. The file itself is kept as it came.
        </p>
      </DropZone>
    </div>
  );
}
