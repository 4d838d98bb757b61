'use client';

import { signIn } from 'next-auth/react';
import { useRef, useState, type FormEvent } from 'react';
import { Button } from '@/components/ui/button';
import { Field, Input } from '@/components/ui/field';

const WRONG = 'This e-mail address and password do not belong together.';
const FAILED = 'The server could not be reached. Try again in a moment.';

export function SignInForm({ next }: { next: string }) {
  const [trouble, setTrouble] = useState<string | null>(null);
  const [busy, setBusy] = useState(false);
  const password = useRef<HTMLInputElement>(null);

  const submit = async (event: FormEvent<HTMLFormElement>) => {
    event.preventDefault();
    if (busy) return;
    const form = new FormData(event.currentTarget);
    setBusy(true);
    setTrouble(null);
    const sentence = await attempt(textOf(form, 'email'), textOf(form, 'password'));
    if (sentence === null) {
      // A full navigation, so that nothing of an earlier session stays in memory.
      window.location.assign(next);
      return;
    }
    setTrouble(sentence);
    setBusy(false);
    password.current?.select();
  };

  return (
    <form onSubmit={(event) => void submit(event)} className="flex flex-col gap-4">
      {trouble && (
        <p role="alert" className="border-l-4 border-umber py-1 pl-3 font-semibold">
          {trouble}
        </p>
      )}
      <Field label="E-mail address" required>
        {(aria) => <Input {...aria} name="email" type="email" autoComplete="username" autoFocus />}
      </Field>
      <Field label="Password" required>
        {(aria) => (
          <Input {...aria} ref={password} name="password" type="password" autoComplete="current-password" />
        )}
      </Field>
      <Button type="submit" busy={busy} className="self-start">
        {busy ? 'Signing in …' : 'Sign in'}
      </Button>
    </form>
  );
}

/** Null where it worked, else the sentence to show. */
async function attempt(email: string, password: string): Promise<string | null> {
  try {
    const answer = await signIn('credentials', { email, password, redirect: false });
    if (answer?.ok && !answer.error) return null;
    // The server's own sentence has blanks in it; a code of next-auth has none.
    return answer?.error?.includes(' ') ? answer.error : WRONG;
  } catch {
    // next-auth throws where the connection fails.
    return FAILED;
  }
}

function textOf(form: FormData, name: string): string {
  const value = form.get(name);
  return typeof value === 'string' ? value : '';
}
