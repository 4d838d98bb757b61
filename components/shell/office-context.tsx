'use client';

import { createContext, use, type ReactNode } from 'react';
import type { OfficeView } from '@/lib/contract/office';
import { LocaleProvider } from '@/components/ui/locale';

const OfficeContext = createContext<OfficeView | null>(null);

export function OfficeProvider({ office, children }: { office: OfficeView; children: ReactNode }) {
  return (
    <OfficeContext value={office}>
      <LocaleProvider locale={office.locale}>{children}</LocaleProvider>
    </OfficeContext>
  );
}

/** The office whose pages these are, and who is looking. Only below the office's shell. */
export function useOfficeView(): OfficeView {
  const office = use(OfficeContext);
  if (!office) throw new Error('useOfficeView is for pages below the office shell.');
  return office;
}

/** Whether the person may do something here: `useMay()('projects:create')`. */
export function useMay(): (permission: string) => boolean {
  const { permissions } = useOfficeView().me;
  return (permission) => permissions.includes(permission);
}
