'use client';

import type { FormEvent } from 'react';
import { Button } from '@/components/ui/button';
import { TextField } from '@/components/ui/field';
import { Notice } from '@/components/ui/notice';
import { useToast } from '@/components/ui/toast';
import { useChangeAccount } from '@/lib/client/use-account';
import { changeAccountBody } from '@/lib/contracts/account';
import { useFields } from './use-fields';

export function NameForm({ name }: { name: string }) {
  const change = useChangeAccount();
  const toast = useToast();
  const { field, read, refuse, general } = useFields(changeAccountBody, { name });

  function submit(event: FormEvent) {
    event.preventDefault();
    const body = read();
    if (!body) return;
    change.mutate(body, { onSuccess: () => toast({ kind: 'ok', text: 'Name saved.' }), onError: refuse });
  }

  return (
    <form noValidate onSubmit={submit} className="grid max-w-md gap-4">
      {general ? <Notice kind="error">{general}</Notice> : null}
      <TextField label="Your name" autoComplete="name" {...field('name')} />
      <Button type="submit" busy={change.isPending} className="justify-self-start">
        Save the name
      </Button>
    </form>
  );
}
