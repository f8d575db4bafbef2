'use client';

import { useRouter } from 'next/navigation';
import { useState, type FormEvent } from 'react';
import { Button } from '@/components/ui/button';
import { TextField } from '@/components/ui/field';
import { Notice } from '@/components/ui/notice';
import { TextLink } from '@/components/ui/text-link';
import { useSignUp } from '@/lib/client/use-account';
import { useSignIn } from '@/lib/client/use-sign-in';
import { signUpBody } from '@/lib/contracts/account';
import { FormSheet } from './form-sheet';
import { PasswordField } from './password-field';
import { useFields } from './use-fields';

/** Makes an account, signs in with it and opens the projects. */
export function SignUpForm() {
  const router = useRouter();
  const signUp = useSignUp();
  const signIn = useSignIn();
  const [leaving, setLeaving] = useState(false);
  const { field, read, refuse, general } = useFields(signUpBody, { name: '', email: '', password: '' });

  async function submit(event: FormEvent) {
    event.preventDefault();
    const fields = read();
    if (!fields) return;
    try {
      await signUp.mutateAsync(fields);
    } catch (error) {
      refuse(error);
      return;
    }
    setLeaving(true);
    // The account stands even if this fails; then the sign-in page is the way on.
    const signedIn = await signIn.mutateAsync({ email: fields.email, password: fields.password }).then(
      () => true,
      () => false,
    );
    router.replace(signedIn ? '/projects' : '/sign-in');
    router.refresh();
  }

  return (
    <FormSheet
      title="Make an account"
      below={
        <>
          Have one already? <TextLink href="/sign-in">Sign in</TextLink>
        </>
      }
    >
      {general ? <Notice kind="error">{general}</Notice> : null}
      <form noValidate onSubmit={submit} className="grid gap-4">
        <TextField
          label="Your name"
          hint="As others in a shared project see it."
          autoComplete="name"
          {...field('name')}
        />
        <TextField
          label="E-mail address"
          type="email"
          autoComplete="username"
          inputMode="email"
          {...field('email')}
        />
        <PasswordField
          label="Password"
          hint="At least 12 characters. A few words in a row are good."
          autoComplete="new-password"
          {...field('password')}
        />
        <Button type="submit" variant="primary" size="large" busy={signUp.isPending || leaving}>
          Make the account
        </Button>
      </form>
    </FormSheet>
  );
}
