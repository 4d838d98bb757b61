'use client';

import { Check } from 'lucide-react';
import { useRouter } from 'next/navigation';
import { signOut } from 'next-auth/react';
import { DropdownMenu } from 'radix-ui';
import { useState } from 'react';
import { useMe } from '@/lib/client/office';
import { useOfficeView } from './office-context';
import { applyTheme, parseTheme, THEMES, type Theme } from './theme';

const ITEM =
  'flex min-h-8 cursor-pointer items-center gap-2 px-3 py-1 outline-none data-highlighted:bg-tint data-highlighted:shadow-[inset_3px_0_var(--cord)]';
const LABEL = 'px-3 pt-2 pb-1 text-slate';

/** Who is signed in, the theme, the keys, and the way out. */
export function AccountMenu({ onKeys }: { onKeys: () => void }) {
  const office = useOfficeView();
  const router = useRouter();
  const me = useMe();
  const [theme, setTheme] = useState<Theme>('system');
  const others = (me.data?.offices ?? []).filter(({ slug }) => slug !== office.slug);
  const choose = (value: string) => {
    const next = parseTheme(value);
    setTheme(next);
    applyTheme(next);
  };
  return (
    <DropdownMenu.Root
      modal={false}
      onOpenChange={(open) => open && setTheme(parseTheme(document.documentElement.dataset.theme))}
    >
      <DropdownMenu.Trigger
        aria-label={`${initials(office.me.name)}, account of ${office.me.name}`}
        className="grid size-8 place-items-center rounded border border-ink bg-leaf font-semibold text-ink hover:bg-tint"
      >
        {initials(office.me.name)}
      </DropdownMenu.Trigger>
      <DropdownMenu.Content
        align="end"
        sideOffset={6}
        collisionPadding={8}
        className="z-40 w-64 border border-t-2 border-hair border-t-ink bg-leaf py-1 text-sm text-ink shadow-lift"
      >
        <DropdownMenu.Label className="border-b border-hair px-3 pt-1 pb-2">
          <span className="block font-semibold">{office.me.name}</span>
          <span className="block break-all text-slate">{office.me.email}</span>
          <span className="block text-slate">
            {office.me.role} · {office.name}
          </span>
        </DropdownMenu.Label>
        {others.length > 0 && <DropdownMenu.Label className={LABEL}>Other offices</DropdownMenu.Label>}
        {others.map(({ slug, name }) => (
          <DropdownMenu.Item key={slug} className={ITEM} onSelect={() => router.push(`/${slug}`)}>
            {name}
          </DropdownMenu.Item>
        ))}
        <DropdownMenu.Label className={LABEL}>Light or dark</DropdownMenu.Label>
        <DropdownMenu.RadioGroup value={theme} onValueChange={choose}>
          {Object.entries(THEMES).map(([value, label]) => (
            <DropdownMenu.RadioItem
              key={value}
              value={value}
              className={ITEM}
              onSelect={(e) => e.preventDefault()}
            >
              <span className="grid size-4 place-items-center">
                <DropdownMenu.ItemIndicator>
                  <Check aria-hidden="true" size={16} />
                </DropdownMenu.ItemIndicator>
              </span>
              {label}
            </DropdownMenu.RadioItem>
          ))}
        </DropdownMenu.RadioGroup>
        <DropdownMenu.Separator className="my-1 h-px bg-hair" />
        <DropdownMenu.Item className={ITEM} onSelect={onKeys}>
          Keys on this page
        </DropdownMenu.Item>
        <DropdownMenu.Item className={ITEM} onSelect={() => void signOut({ callbackUrl: '/sign-in' })}>
          Sign out
        </DropdownMenu.Item>
      </DropdownMenu.Content>
    </DropdownMenu.Root>
  );
}

export function initials(name: string): string {
  const words = name.trim().split(/\s+/);
  const first = words[0]?.charAt(0) ?? '';
  const last = words.length > 1 ? (words.at(-1)?.charAt(0) ?? '') : '';
  return (first + last).toUpperCase();
}
