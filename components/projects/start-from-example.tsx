'use client';

import { Button } from '@/components/ui/button';
import { Notice } from '@/components/ui/notice';
import { sentenceOf } from '@/lib/client/api-error';
import { useCreateProject } from '@/lib/client/use-projects';
import type { Project } from '@/lib/contracts/project';
import { examples } from './project-words';

/** Jobs that are ready; what is made of one is one's own. */
export function StartFromExample({ onMade }: { onMade: (project: Project) => void }) {
  const create = useCreateProject();
  const busy = create.isPending || create.isSuccess;
  return (
    <div className="grid gap-4">
      {create.error ? <Notice kind="error">{sentenceOf(create.error)}</Notice> : null}
      <ul className="border-t border-rule">
        {examples.map(({ id, name, about }) => (
          <li key={id} className="flex items-center gap-4 border-b border-rule py-3">
            <div className="grow">
              <h3 className="text-lg">{name}</h3>
              <p className="text-pretty text-graphite">{about}</p>
            </div>
            <Button
              busy={busy && create.variables?.from === 'example' && create.variables.example === id}
              disabled={busy}
              aria-label={`Begin with ${name}`}
              onClick={() => create.mutate({ from: 'example', example: id }, { onSuccess: onMade })}
            >
              Begin
            </Button>
          </li>
        ))}
      </ul>
    </div>
  );
}
