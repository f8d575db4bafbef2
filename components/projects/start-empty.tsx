'use client';

import { useState, type FormEvent } from 'react';
import { Button } from '@/components/ui/button';
import { Choice } from '@/components/ui/choice';
import { TextField } from '@/components/ui/field';
import { Notice } from '@/components/ui/notice';
import { sentenceOf } from '@/lib/client/api-error';
import { useCreateProject } from '@/lib/client/use-projects';
import { plainName } from '@/lib/contracts/account';
import type { Project } from '@/lib/contracts/project';
import { boardFieldsIn, BoardFields, readBoard } from './board-fields';

type Unit = 'mm' | 'in';

/** Names the project and asks how large the board is. */
export function StartEmpty({ onMade }: { onMade: (project: Project) => void }) {
  const [name, setName] = useState('');
  const [unit, setUnit] = useState<Unit>('mm');
  const [board, setBoard] = useState(boardFieldsIn('mm'));
  const [checked, setChecked] = useState(false);
  const create = useCreateProject();
  const named = plainName.safeParse(name);

  function changeUnit(next: Unit) {
    setUnit(next);
    setBoard(boardFieldsIn(next, readBoard(board, unit) ?? undefined));
  }

  function submit(event: FormEvent) {
    event.preventDefault();
    setChecked(true);
    const size = readBoard(board, unit);
    if (!named.success || !size) return;
    create.mutate({ from: 'empty', name: named.data, board: size, display: unit }, { onSuccess: onMade });
  }

  return (
    <form noValidate onSubmit={submit} className="grid gap-4">
      {create.error ? <Notice kind="error">{sentenceOf(create.error)}</Notice> : null}
      <TextField
        label="Name of the project"
        value={name}
        onChange={({ target }) => setName(target.value)}
        placeholder="Hallway rail"
        autoComplete="off"
        {...(checked && !named.success ? { error: 'Give it a name of 1 to 80 characters.' } : {})}
      />
      <div className="flex items-end justify-between gap-3">
        <p className="font-medium">The board</p>
        <Choice
          label="Unit"
          value={unit}
          onChange={changeUnit}
          options={[
            { value: 'mm', label: 'mm' },
            { value: 'in', label: 'inches' },
          ]}
        />
      </div>
      <BoardFields fields={board} unit={unit} checked={checked} onChange={setBoard} />
      <Button
        type="submit"
        variant="primary"
        busy={create.isPending || create.isSuccess}
        className="justify-self-end"
      >
        Make the project
      </Button>
    </form>
  );
}
