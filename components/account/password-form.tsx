'use client';

import type { FormEvent } from 'react';
import { Button } from '@/components/ui/button';
import { Notice } from '@/components/ui/notice';
import { useToast } from '@/components/ui/toast';
import { ApiError } from '@/lib/client/api-error';
import { useChangePassword } from '@/lib/client/use-account';
import { changePasswordBody } from '@/lib/contracts/account';
import { PasswordField } from './password-field';
import { useFields } from './use-fields';

export function PasswordForm() {
  const change = useChangePassword();
  const toast = useToast();
  const { field, read, refuse, clear, general } = useFields(changePasswordBody, { current: '', next: '' });

  function submit(event: FormEvent) {
    event.preventDefault();
    const body = read();
    if (!body) return;
    change.mutate(body, {
      onSuccess: () => {
        clear();
        toast({ kind: 'ok', text: 'Password changed. Every other device is signed out.' });
      },
      onError: refuse,
    });
  }

  const wrong = change.error instanceof ApiError && change.error.code === 'wrong-password';
  return (
    <form noValidate onSubmit={submit} className="grid max-w-md gap-4">
      {general ? (
        <Notice kind="error">
          {wrong ? 'The present password is not right. Nothing was changed.' : general}
        </Notice>
      ) : null}
      <PasswordField label="Present password" autoComplete="current-password" {...field('current')} />
      <PasswordField
        label="New password"
        hint="At least 12 characters."
        autoComplete="new-password"
        {...field('next')}
      />
      <Button type="submit" busy={change.isPending} className="justify-self-start">
        Change the password
      </Button>
    </form>
  );
}
