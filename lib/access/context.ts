import type { Role } from '@/lib/contract/shared';

/** A person who proved who they are, by a session's cookie or by a token. */
export interface Identity {
  readonly user: { readonly id: string; readonly name: string; readonly email: string };
  readonly via: 'session' | 'token';
  /** A token that may only read. */
  readonly readOnly: boolean;
  /** The one office a token is for; null for a session. */
  readonly office: string | null;
}

/** In whose name a use-case runs: a person as a member of one office. */
export interface OfficeContext {
  readonly office: {
    readonly id: string;
    readonly slug: string;
    readonly name: string;
    readonly locale: string;
  };
  readonly user: Identity['user'];
  readonly role: Role;
  /** The contractor a scheduler works for; null for the office's own people. */
  readonly contractor: string | null;
  readonly membership: string;
  readonly via: Identity['via'];
  readonly readOnly: boolean;
}
