'use client';

import Link from 'next/link';
import { useState, type ReactNode } from 'react';
import { useHotkeys } from '@/components/ui/hotkeys';
import { KeysDialog } from '@/components/ui/keys-dialog';
import { AccountMenu } from './account-menu';
import { CrumbTrail } from './crumbs';
import { FindButton, FindDialog } from './find-dialog';
import { Mark } from './mark';
import { useOfficeView } from './office-context';

/** The row everything hangs from. */
export function MastheadFrame({ home, children }: { home: string; children?: ReactNode }) {
  return (
    <header className="relative z-10 flex min-h-13 items-center gap-4 border-b-2 border-ink bg-leaf px-4 py-1 sm:px-6">
      <Link
        href={home}
        className="flex shrink-0 items-center gap-2 text-base font-semibold text-ink no-underline"
      >
        <Mark />
        <span className="max-sm:sr-only">Plumbrow</span>
      </Link>
      {children}
    </header>
  );
}

export function Masthead() {
  const office = useOfficeView();
  const [keysOpen, setKeysOpen] = useState(false);
  const [finding, setFinding] = useState(false);
  const home = `/${office.slug}`;
  useHotkeys('Everywhere', [
    { key: 'f', does: 'Find a project, an activity, a rule', run: () => setFinding(true) },
    { key: '?', does: 'Show this list of keys', run: () => setKeysOpen(true) },
  ]);
  return (
    <MastheadFrame home={home}>
      <CrumbTrail office={{ label: office.name, href: home }} />
      <div className="flex items-center gap-2 print:hidden">
        <FindButton onOpen={() => setFinding(true)} />
        <AccountMenu onKeys={() => setKeysOpen(true)} />
      </div>
      {finding && <FindDialog onClose={() => setFinding(false)} />}
      <KeysDialog open={keysOpen} onOpenChange={setKeysOpen} />
    </MastheadFrame>
  );
}
