import { useId } from 'react';

/** How far something is, in words and as a line that the bob travels along. `share` null: under way, no measure. */
export function Progress({ label, share }: { label: string; share: number | null }) {
  const id = useId();
  const percent = share === null ? undefined : Math.round(share * 100);
  return (
    <div className="flex flex-col gap-1">
      <span id={id} role="status">
        {label}
      </span>
      <div
        role="progressbar"
        aria-labelledby={id}
        aria-valuemin={0}
        aria-valuemax={100}
        aria-valuenow={percent}
        className="relative h-2 border border-slate bg-leaf"
      >
        <div
          className={`h-full bg-cord ${share === null ? 'w-full animate-pulse' : ''}`}
          style={percent === undefined ? undefined : { width: `${String(percent)}%` }}
        />
      </div>
    </div>
  );
}
