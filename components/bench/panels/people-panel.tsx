'use client';

import { useState, type FormEvent } from 'react';
import { Button, IconButton } from '@/components/ui/button';
import { TextField } from '@/components/ui/field';
import { Notice } from '@/components/ui/notice';
import { SelectField } from '@/components/ui/select';
import { ErrorState, LoadingState } from '@/components/ui/states';
import { Tag } from '@/components/ui/tag';
import { sentenceOf } from '@/lib/client/api-error';
import { useAddMember, useChangeMember, useMembers, useRemoveMember } from '@/lib/client/use-members';
import type { GivenRole, ProjectMember } from '@/lib/contracts/member';
import { mayInProject } from '@/lib/contracts/roles';
import { useBench } from '../bench-context';

const ROLE_WORDS: Readonly<Record<GivenRole, string>> = { editor: 'may edit', reviewer: 'may comment' };

/** Who is in the project; its owner adds people by the e-mail address of their account. */
export function PeoplePanel() {
  const { project } = useBench();
  const members = useMembers(project.id);
  const isOwner = mayInProject(project.role, 'project.manage-members');
  if (members.isPending) return <LoadingState title="Fetching who is here" />;
  if (members.isError)
    return (
      <ErrorState title="The list did not come" onRetry={() => void members.refetch()}>
        {sentenceOf(members.error)}
      </ErrorState>
    );
  return (
    <div className="grid gap-4">
      {isOwner ? <AddMember /> : <Notice>Only the project’s owner can add people.</Notice>}
      <ul className="grid">
        {members.data.items.map((member) => (
          <Member key={member.person.id} member={member} editable={isOwner && member.role !== 'owner'} />
        ))}
      </ul>
    </div>
  );
}

function AddMember() {
  const { project } = useBench();
  const add = useAddMember(project.id);
  const [email, setEmail] = useState('');
  const [role, setRole] = useState<GivenRole>('reviewer');
  const submit = (event: FormEvent): void => {
    event.preventDefault();
    add.mutate({ email, role }, { onSuccess: () => setEmail('') });
  };
  return (
    <form onSubmit={submit} className="grid gap-2">
      <TextField
        label="E-mail address of their account"
        type="email"
        required
        autoComplete="off"
        value={email}
        onChange={(event) => setEmail(event.currentTarget.value)}
        {...(add.error ? { error: sentenceOf(add.error) } : {})}
      />
      <SelectField
        label="They"
        value={role}
        onChange={(event) => setRole(event.currentTarget.value === 'editor' ? 'editor' : 'reviewer')}
      >
        <option value="reviewer">may look and comment (reviewer)</option>
        <option value="editor">may change the job (editor)</option>
      </SelectField>
      <Button type="submit" variant="primary" icon="plus" busy={add.isPending}>
        Add to the project
      </Button>
    </form>
  );
}

function Member({ member, editable }: { member: ProjectMember; editable: boolean }) {
  const { project } = useBench();
  const change = useChangeMember(project.id);
  const remove = useRemoveMember(project.id);
  const { person, role } = member;
  const problem = change.error ?? remove.error;
  return (
    <li className="grid gap-1 border-b border-rule py-2">
      <div className="flex flex-wrap items-center gap-2">
        <span className="min-w-0 grow">
          {person.name}
          {member.email ? <span className="block truncate text-sm text-graphite">{member.email}</span> : null}
        </span>
        {editable && role !== 'owner' ? (
          <>
            <SelectField
              label={`What ${person.name} may do`}
              hideLabel
              value={role}
              onChange={(event) =>
                change.mutate({
                  userId: person.id,
                  role: event.currentTarget.value === 'editor' ? 'editor' : 'reviewer',
                })
              }
            >
              <option value="reviewer">{ROLE_WORDS.reviewer}</option>
              <option value="editor">{ROLE_WORDS.editor}</option>
            </SelectField>
            <IconButton
              icon="close"
              size="small"
              label={`Remove ${person.name}`}
              onClick={() => remove.mutate(person.id)}
            />
          </>
        ) : (
          <Tag>{role}</Tag>
        )}
      </div>
      {problem ? <p className="text-error">{sentenceOf(problem)}</p> : null}
    </li>
  );
}
