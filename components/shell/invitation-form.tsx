'use client';

import Link from 'next/link';
import { signIn } from 'next-auth/react';
import { useState, type FormEvent } from 'react';
import { Button } from '@/components/ui/button';
import { Field, Input } from '@/components/ui/field';
import { ErrorState, Loading } from '@/components/ui/states';
import { ClientError, sentenceOf } from '@/lib/client/error';
import { useAcceptInvitation, useInvitation, type InvitationCheck } from '@/lib/client/invitations';

const LEAST = 12;

/** The one-time link: who it is for, and a password of their own. */
export function InvitationForm({ token }: { token: string }) {
  const invitation = useInvitation(token);
  if (invitation.data) return <PasswordForm token={token} invitation={invitation.data} />;
  if (!invitation.error) return <Loading label="Looking at the link" rows={2} />;
  return (
    <ErrorState
      error={invitation.error}
      title="This link does not open anything"
      retry={() => void invitation.refetch()}
    >
      <p className="mt-2">
        If you have set your password already, <Link href="/sign-in">sign in</Link>. Otherwise ask the
        administrator of your office for a new link.
      </p>
    </ErrorState>
  );
}

function PasswordForm({ token, invitation }: { token: string; invitation: InvitationCheck }) {
  const accept = useAcceptInvitation(token);
  const [password, setPassword] = useState('');
  const [shown, setShown] = useState(false);
  const [tooShort, setTooShort] = useState(false);
  const busy = accept.isPending || accept.isSuccess;

  const submit = (event: FormEvent) => {
    event.preventDefault();
    if (busy) return;
    setTooShort(password.length < LEAST);
    if (password.length < LEAST) return;
    accept.mutate(password, { onSuccess: () => void enter(invitation.email, password) });
  };
  const fieldError = accept.error instanceof ClientError ? accept.error.fieldErrors.password : undefined;

  return (
    <form onSubmit={submit} className="flex flex-col gap-4">
      <p>
        {invitation.name}, {invitation.office} has made you an account. Choose a password for it; this link
        works once.
      </p>
      {accept.error && !fieldError && (
        <p role="alert" className="border-l-4 border-umber py-1 pl-3 font-semibold">
          {sentenceOf(accept.error)}
        </p>
      )}
      <Field label="E-mail address" required>
        {(aria) => <Input {...aria} value={invitation.email} readOnly autoComplete="username" type="email" />}
      </Field>
      <Field
        label="Password"
        hint={`At least ${String(LEAST)} characters. A few words that only you would put together are best.`}
        error={tooShort ? `Use at least ${String(LEAST)} characters.` : fieldError}
        required
      >
        {(aria) => (
          <Input
            {...aria}
            type={shown ? 'text' : 'password'}
            autoComplete="new-password"
            value={password}
            onChange={(event) => {
              setPassword(event.target.value);
              setTooShort(false);
            }}
          />
        )}
      </Field>
      <label className="flex items-center gap-2">
        <input
          type="checkbox"
          className="accent-cord"
          checked={shown}
          onChange={(event) => setShown(event.target.checked)}
        />
        Show the password
      </label>
      <Button type="submit" busy={busy} className="self-start">
        {busy ? 'Setting the password …' : 'Set the password'}
      </Button>
    </form>
  );
}

/** Signs in with what was just set; where that fails, the sign-in page will say why. */
async function enter(email: string, password: string): Promise<void> {
  const answer = await signIn('credentials', { email, password, redirect: false }).catch(() => undefined);
  window.location.assign(answer?.ok && !answer.error ? '/' : '/sign-in');
}
