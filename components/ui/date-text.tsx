'use client';

import { useFormat } from './locale';

/** A calendar date, or an instant with its time of day. */
export function DateText({ value, time = false }: { value: string; time?: boolean }) {
  const format = useFormat();
  return (
    <time dateTime={value} className="whitespace-nowrap">
      {time ? format.instant(value) : format.date(value)}
    </time>
  );
}
