'use client';

import { signIn } from 'next-auth/react';
import { useState } from 'react';
import { Button } from '@/components/ui/button';
import { TextField } from '@/components/ui/field';
import { Notice } from '@/components/ui/notice';

export function SignInForm() {
  const [error, setError] = useState<string | null>(null);
  const [busy, setBusy] = useState(false);

  const submit = async (form: FormData) => {
    setBusy(true);
    setError(null);
    const answer = await signIn('credentials', {
      email: String(form.get('email')),
      password: String(form.get('password')),
      redirect: false,
    }).catch(() => undefined);
    if (answer?.ok) {
      // A whole page load: nothing of an earlier person's session stays in memory.
      window.location.assign('/sites');
      return;
    }
    setBusy(false);
    setError(
      answer?.status === 401
        ? 'The e-mail address or the password is not right. Check both and try again.'
        : 'The server could not be reached. Check the network and try again.',
    );
  };

  return (
    <form
      className="flex flex-col gap-4"
      onSubmit={(event) => {
        event.preventDefault();
        void submit(new FormData(event.currentTarget));
      }}
    >
      {error ? (
        <Notice tone="danger" role="alert">
          {error}
        </Notice>
      ) : null}
      <TextField label="E-mail" name="email" type="email" autoComplete="username" required maxLength={200} />
      <TextField
        label="Password"
        name="password"
        type="password"
        autoComplete="current-password"
        required
        maxLength={200}
      />
      <Button type="submit" variant="primary" disabled={busy} className="h-10">
        {busy ? 'Signing in…' : 'Sign in'}
      </Button>
    </form>
  );
}
