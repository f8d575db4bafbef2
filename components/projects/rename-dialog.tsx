'use client';

import { useId, useState, type FormEvent } from 'react';
import { Button } from '@/components/ui/button';
import { Dialog } from '@/components/ui/dialog';
import { TextField } from '@/components/ui/field';
import { sentenceOf } from '@/lib/client/api-error';
import { useChangeProject } from '@/lib/client/use-projects';
import { plainName } from '@/lib/contracts/account';
import type { ProjectItem } from '@/lib/contracts/project';

export function RenameDialog({ project, onClose }: { project: ProjectItem; onClose: () => void }) {
  const [name, setName] = useState(project.name);
  const change = useChangeProject();
  const form = useId();
  const parsed = plainName.safeParse(name);
  const error = parsed.success
    ? change.error && sentenceOf(change.error)
    : 'Give it a name of 1 to 80 characters.';

  function submit(event: FormEvent) {
    event.preventDefault();
    if (!parsed.success) return;
    change.mutate({ projectId: project.id, change: { name: parsed.data } }, { onSuccess: onClose });
  }

  return (
    <Dialog
      open
      onOpenChange={onClose}
      width="narrow"
      title="Rename the project"
      actions={
        <>
          <Button onClick={onClose}>Leave it</Button>
          <Button type="submit" form={form} variant="primary" busy={change.isPending}>
            Rename
          </Button>
        </>
      }
    >
      <form id={form} noValidate onSubmit={submit}>
        <TextField
          label="Name"
          value={name}
          onChange={({ target }) => setName(target.value)}
          onFocus={({ target }) => target.select()}
          {...(error ? { error } : {})}
        />
      </form>
    </Dialog>
  );
}
