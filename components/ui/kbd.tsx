import type { ReactNode } from 'react';
import { classes } from './classes';

/** A key of the keyboard. `inherit`: in the colour of the button it stands in. */
export function Kbd({ children, inherit = false }: { children: ReactNode; inherit?: boolean }) {
  return (
    <kbd
      aria-hidden={inherit || undefined}
      className={classes(
        'inline-block min-w-5 rounded border px-1 text-center font-sans text-sm leading-5 font-semibold',
        inherit ? 'border-current max-sm:hidden' : 'border-slate bg-leaf text-ink',
      )}
    >
      {children}
    </kbd>
  );
}
