'use client';

import { useRouter } from 'next/navigation';
import { useState, type FormEvent } from 'react';
import { Button } from '@/components/ui/button';
import { TextField } from '@/components/ui/field';
import { Notice } from '@/components/ui/notice';
import { TextLink } from '@/components/ui/text-link';
import { useSignIn } from '@/lib/client/use-sign-in';
import { signInFields } from '@/lib/contracts/account';
import { FormSheet } from './form-sheet';
import { PasswordField } from './password-field';
import { useFields } from './use-fields';

interface SignInFormProps {
  readonly demo: { readonly email: string; readonly password: string } | null;
  /** A path of this site. */
  readonly returnTo: string;
  /** Whether the reader comes here because a session has ended. */
  readonly ended: boolean;
}

export function SignInForm({ demo, returnTo, ended }: SignInFormProps) {
  const router = useRouter();
  const signIn = useSignIn();
  const [leaving, setLeaving] = useState(false);
  const { field, read } = useFields(signInFields, { email: '', password: '' });

  function enter(fields: { email: string; password: string }) {
    signIn.mutate(fields, {
      onSuccess: () => {
        setLeaving(true);
        router.replace(returnTo);
        router.refresh();
      },
    });
  }

  function submit(event: FormEvent) {
    event.preventDefault();
    const fields = read();
    if (fields) enter(fields);
  }

  return (
    <FormSheet
      title="Sign in"
      below={
        <>
          New here? <TextLink href="/sign-up">Make an account</TextLink>
        </>
      }
    >
      {ended && !signIn.error ? <Notice>You were signed out. Sign in again to go on.</Notice> : null}
      {signIn.error ? <Notice kind="error">{signIn.error.message}</Notice> : null}
      <form noValidate onSubmit={submit} className="grid gap-4">
        <TextField
          label="E-mail address"
          type="email"
          autoComplete="username"
          inputMode="email"
          {...field('email')}
        />
        <PasswordField label="Password" autoComplete="current-password" {...field('password')} />
        <Button type="submit" variant="primary" size="large" busy={signIn.isPending || leaving}>
          Sign in
        </Button>
      </form>
      {demo ? (
        <div className="grid gap-2 border-t border-rule pt-4">
          <p className="text-graphite">
            Only looking? The demo is <span className="figure text-ink">{demo.email}</span> with the password{' '}
            <span className="figure text-ink">{demo.password}</span>.
          </p>
          <Button onClick={() => enter(demo)} disabled={signIn.isPending || leaving}>
            Sign in to the demo
          </Button>
        </div>
      ) : null}
    </FormSheet>
  );
}
