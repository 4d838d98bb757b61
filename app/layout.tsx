import '@fontsource/source-sans-3/400.css';
import '@fontsource/source-sans-3/600.css';
import type { Metadata, Viewport } from 'next';
import { cookies, headers } from 'next/headers';
import type { ReactNode } from 'react';
import { parseTheme, THEME_COOKIE } from '@/components/shell/theme';
import { NonceProvider } from '@/components/ui/nonce';
import { ToastProvider } from '@/components/ui/toast';
import { QueryProvider } from '@/lib/client/provider';
import './globals.css';

export const metadata: Metadata = {
  title: { default: 'Plumbrow', template: '%s · Plumbrow' },
  description:
    'Receives contractors’ activity lists, audits them, recomputes the finish and its uncertainty.',
  robots: { index: false, follow: false },
};

export const viewport: Viewport = {
  width: 'device-width',
  initialScale: 1,
  themeColor: [
    { media: '(prefers-color-scheme: light)', color: '#ffffff' },
    { media: '(prefers-color-scheme: dark)', color: '#1c2326' },
  ],
};

export default async function RootLayout({ children }: { children: ReactNode }) {
  const nonce = (await headers()).get('x-nonce') ?? '';
  // The server writes the theme into the document, so that nothing flashes.
  const theme = parseTheme((await cookies()).get(THEME_COOKIE)?.value);
  return (
    <html lang="en" data-theme={theme === 'system' ? undefined : theme}>
      <body>
        <NonceProvider nonce={nonce}>
          <QueryProvider>
            <ToastProvider>{children}</ToastProvider>
          </QueryProvider>
        </NonceProvider>
      </body>
    </html>
  );
}
