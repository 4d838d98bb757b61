'use client';

import type { ReactNode } from 'react';
import { useDropzone, type FileRejection } from 'react-dropzone';
import { Button } from '@/components/ui/button';
import { classes } from '@/components/ui/classes';
import { formatBytes } from '@/lib/client/format';

const LARGEST_BYTES = 20 * 1024 * 1024;

interface Props {
  onFile: (file: File) => void;
  /** What was dropped cannot be sent at all: the sentence for it. */
  onRefused: (sentence: string) => void;
  compact?: boolean;
  children?: ReactNode;
}

/** Takes one file: dropped, or chosen with the button. What the file is, the server judges. */
export function DropZone({ onFile, onRefused, compact = false, children }: Props) {
  const { getRootProps, getInputProps, open, isDragActive } = useDropzone({
    multiple: false,
    maxSize: LARGEST_BYTES,
    noKeyboard: true,
    onDropAccepted: ([file]) => {
      if (file) onFile(file);
    },
    onDropRejected: (rejections) => onRefused(refusal(rejections)),
  });
  return (
    <div
      {...getRootProps({ role: 'group', 'aria-label': 'Hand in an activity list', tabIndex: undefined })}
      className={classes(
        'relative flex flex-col items-center gap-2 border-2 border-dashed px-4 text-center',
        compact ? 'py-5' : 'py-10',
        isDragActive ? 'border-cord bg-tint' : 'border-slate bg-leaf',
      )}
    >
      <input {...getInputProps({ 'aria-label': 'Activity list' })} />
      <p className="text-base font-semibold">
        {isDragActive ? 'Let go, and it is read' : 'Drop the contractor’s workbook or CSV here'}
      </p>
      {children}
      <Button
        variant={compact ? 'ghost' : 'solid'}
        onClick={(event) => {
          event.stopPropagation();
          open();
        }}
      >
        Choose a file
      </Button>
      <p className="text-slate">XLSX or CSV, up to 20 MB and 200 000 rows.</p>
    </div>
  );
}

export function refusal(rejections: readonly FileRejection[]): string {
  if (rejections.length > 1)
    return 'Drop one file at a time. A list that goes on over several sheets stays in one workbook.';
  const [rejection] = rejections;
  if (rejection?.errors.some(({ code }) => code === 'file-too-large')) {
    return `“${rejection.file.name}” is ${formatBytes(rejection.file.size)}; at most 20 MB are taken in. Nothing was sent.`;
  }
  return 'That could not be taken in. Drop one workbook or CSV file.';
}
