import type { ComponentProps } from 'react';
import { classes } from './classes';

/** A table that scrolls sideways by itself where the page is narrow; `label` names it. */
export function Table({ label, className, children, ...rest }: { label: string } & ComponentProps<'table'>) {
  return (
    <div role="region" aria-label={label} tabIndex={0} className="relative max-w-full overflow-x-auto">
      <table {...rest} className={classes('w-full border-collapse bg-leaf text-left', className)}>
        {children}
      </table>
    </div>
  );
}

export function Th({ numeric = false, className, ...rest }: { numeric?: boolean } & ComponentProps<'th'>) {
  return (
    <th
      scope="col"
      {...rest}
      className={classes(
        'border-b border-ink px-3 py-2 align-bottom font-semibold text-slate',
        numeric && 'text-right',
        className,
      )}
    />
  );
}

export function Td({ numeric = false, className, ...rest }: { numeric?: boolean } & ComponentProps<'td'>) {
  return (
    <td
      {...rest}
      className={classes(
        'border-b border-hair px-3 py-2 align-top',
        numeric && 'text-right whitespace-nowrap',
        className,
      )}
    />
  );
}
