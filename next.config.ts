import type { NextConfig } from 'next';

/** Sent with everything; the content security policy of the pages, which needs a nonce, comes from proxy.ts. */
const securityHeaders = [
  { key: 'X-Content-Type-Options', value: 'nosniff' },
  { key: 'X-Frame-Options', value: 'DENY' },
  { key: 'Referrer-Policy', value: 'same-origin' },
  { key: 'Cross-Origin-Opener-Policy', value: 'same-origin' },
  { key: 'Cross-Origin-Resource-Policy', value: 'same-origin' },
  { key: 'Permissions-Policy', value: 'camera=(), microphone=(), geolocation=(), payment=(), usb=()' },
];

/** Answers of the HTTP surface are data: nothing in them may load or run anything. */
const apiPolicy = [
  { key: 'Content-Security-Policy', value: "default-src 'none'; frame-ancestors 'none'; base-uri 'none'" },
];

const config: NextConfig = {
  poweredByHeader: false,
  reactStrictMode: true,
  // `npm run verify` checks the types of everything; a start on somebody's machine need not do it again.
  typescript: { ignoreBuildErrors: true },
  serverExternalPackages: ['exceljs', 'pg', 'pino', '@node-rs/argon2'],
  turbopack: { root: import.meta.dirname },
  headers: () =>
    Promise.resolve([
      { source: '/:path*', headers: securityHeaders },
      { source: '/api/:path*', headers: apiPolicy },
    ]),
};

export default config;
