'use client';

import { createContext, use, useMemo, type ReactNode } from 'react';
import * as format from '@/lib/client/format';

const LocaleContext = createContext(format.DEFAULT_LOCALE);

export function LocaleProvider({ locale, children }: { locale: string; children: ReactNode }) {
  return <LocaleContext value={locale}>{children}</LocaleContext>;
}

/** The formats of lib/client/format, in the office's locale. */
export function useFormat() {
  const locale = use(LocaleContext);
  return useMemo(
    () => ({
      locale,
      date: (iso: string) => format.formatDate(iso, locale),
      instant: (iso: string) => format.formatInstant(iso, locale),
      number: (value: number, decimals: number) => format.formatNumber(value, decimals, locale),
      count: (value: number) => format.formatCount(value, locale),
      days: (value: number, decimals?: number) => format.formatDays(value, locale, decimals),
      dayDifference: (value: number) => format.formatDayDifference(value, locale),
      signed: (value: number, decimals: number) => format.formatSigned(value, decimals, locale),
      variance: (value: number) => format.formatVariance(value, locale),
      percent: (value: number) => format.formatPercent(value, locale),
      bytes: (value: number) => format.formatBytes(value, locale),
      plural: (count: number, one: string, many: string) => format.plural(count, one, many, locale),
    }),
    [locale],
  );
}
export type Format = ReturnType<typeof useFormat>;
