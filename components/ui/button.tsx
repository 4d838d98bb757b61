import Link from 'next/link';
import type { ComponentProps, ReactNode } from 'react';
import { classes } from './classes';
import { Kbd } from './kbd';

type Variant = 'solid' | 'ghost' | 'quiet';

interface Looks {
  variant?: Variant;
  /** The key that does the same, shown in the button. */
  shortcut?: string;
  children: ReactNode;
}

/** `busy` keeps the button in the tab order and says that its work is under way; it does nothing meanwhile. */
export type ButtonProps = Looks & { busy?: boolean } & ComponentProps<'button'>;

export function Button({
  variant = 'solid',
  shortcut,
  busy = false,
  className,
  children,
  onClick,
  type = 'button',
  ...rest
}: ButtonProps) {
  return (
    <button
      {...rest}
      type={busy ? 'button' : type}
      aria-disabled={busy || undefined}
      aria-busy={busy || undefined}
      aria-keyshortcuts={shortcut}
      onClick={busy ? undefined : onClick}
      className={classes(looks(variant), className)}
    >
      {children}
      {shortcut && <Kbd inherit>{shortcut}</Kbd>}
    </button>
  );
}

export function ButtonLink({
  variant = 'solid',
  shortcut,
  className,
  children,
  ...rest
}: Looks & ComponentProps<typeof Link>) {
  return (
    <Link {...rest} className={classes(looks(variant), 'no-underline', className)}>
      {children}
      {shortcut && <Kbd inherit>{shortcut}</Kbd>}
    </Link>
  );
}

/** For an address that is no page of ours, such as a file to download. */
export function ButtonAnchor({
  variant = 'solid',
  className,
  children,
  ...rest
}: Omit<Looks, 'shortcut'> & ComponentProps<'a'>) {
  return (
    <a {...rest} className={classes(looks(variant), 'no-underline', className)}>
      {children}
    </a>
  );
}

const BASE =
  'inline-flex min-h-8 items-center justify-center gap-2 rounded border px-3 py-1 text-sm font-semibold print:hidden ' +
  'disabled:cursor-not-allowed disabled:opacity-50 aria-disabled:cursor-progress aria-disabled:opacity-60';

const VARIANTS: Record<Variant, string> = {
  solid: 'border-cord bg-cord text-leaf hover:not-disabled:border-ink hover:not-disabled:bg-ink',
  ghost: 'border-cord bg-transparent text-cord hover:not-disabled:bg-tint',
  quiet: 'border-transparent bg-transparent text-cord hover:not-disabled:bg-tint',
};

function looks(variant: Variant): string {
  return `${BASE} ${VARIANTS[variant]}`;
}
