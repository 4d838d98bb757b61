'use client';

import { setNonce } from 'get-nonce';
import { createContext, use, useState, type ReactNode } from 'react';

const NonceContext = createContext('');

/**
 * The nonce of the document's content security policy. Moving between pages keeps the first document and
 * its policy, so the first nonce stays, whatever later requests bring.
 */
export function NonceProvider({ nonce, children }: { nonce: string; children: ReactNode }) {
  const [first] = useState(() => {
    if (typeof window !== 'undefined') setNonce(nonce);
    return nonce;
  });
  return <NonceContext value={first}>{children}</NonceContext>;
}

/** For what makes `<style>` elements of its own, such as the grid. */
export function useNonce(): string {
  return use(NonceContext);
}
