import type { ComponentProps } from 'react';
import { classes } from './classes';

/** A choice that is on or off: `pressed` says which, by a dark frame and weight. */
export function Chip({ pressed, className, ...rest }: { pressed: boolean } & ComponentProps<'button'>) {
  return (
    <button
      type="button"
      {...rest}
      aria-pressed={pressed}
      className={classes(
        'inline-flex min-h-8 items-center gap-1 rounded border bg-leaf px-3 py-1 text-sm whitespace-nowrap',
        'disabled:cursor-not-allowed disabled:opacity-50',
        pressed
          ? 'border-ink font-semibold text-ink shadow-[inset_0_-2px_0_var(--ink)]'
          : 'border-hair text-ink hover:border-slate',
        className,
      )}
    />
  );
}
