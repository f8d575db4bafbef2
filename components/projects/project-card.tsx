'use client';

import Link from 'next/link';
import { useRouter } from 'next/navigation';
import { useState } from 'react';
import { IconButton } from '@/components/ui/button';
import { Icon } from '@/components/ui/icon';
import { Menu, MenuItem, MenuRule } from '@/components/ui/menu';
import { SinceTime } from '@/components/ui/since-time';
import { Tag } from '@/components/ui/tag';
import { useToast } from '@/components/ui/toast';
import { sentenceOf } from '@/lib/client/api-error';
import { useDuplicateProject } from '@/lib/client/use-projects';
import type { ProjectItem } from '@/lib/contracts/project';
import { mayInProject } from '@/lib/contracts/roles';
import { boardSizeText } from './board-size';
import { FacePictures } from './face-pictures';
import { roleWords, stateWords } from './project-words';
import { RenameDialog } from './rename-dialog';

interface ProjectCardProps {
  readonly project: ProjectItem;
  readonly onDelete: () => void;
}

/** A project on the list. The whole card opens it; the menu holds the rest. */
export function ProjectCard({ project, onDelete }: ProjectCardProps) {
  const state = stateWords[project.state];
  return (
    <article className="group relative flex flex-col border border-rule bg-sheet focus-within:border-edge hover:border-edge">
      <FacePictures project={project} />
      <div className="mt-auto grid gap-2 border-t border-rule px-4 pt-3 pb-3.5">
        <div className="flex items-start gap-2">
          <h2 className="min-w-0 grow text-xl">
            <Link
              href={`/projects/${project.id}`}
              className="line-clamp-2 break-words after:absolute after:inset-0 group-hover:underline"
            >
              {project.name}
            </Link>
          </h2>
          <CardMenu project={project} onDelete={onDelete} />
        </div>
        <p className="figure text-sm text-graphite">
          {boardSizeText(project.board)}
          {project.material ? ` · ${project.material}` : null}
        </p>
        <div className="flex flex-wrap items-center gap-x-2 gap-y-1.5">
          <Tag tone={state.tone}>{state.label}</Tag>
          {project.role === 'owner' ? null : (
            <>
              <Tag icon="people">from {project.owner.name}</Tag>
              <Tag>{roleWords[project.role]}</Tag>
            </>
          )}
          {project.openComments > 0 ? <Tag icon="comment">{commentCount(project.openComments)}</Tag> : null}
          <span className="ml-auto text-sm text-graphite">
            <SinceTime moment={project.updatedAt} />
          </span>
        </div>
      </div>
    </article>
  );
}

function CardMenu({ project, onDelete }: ProjectCardProps) {
  const [renaming, setRenaming] = useState(false);
  const duplicate = useDuplicateProject();
  const toast = useToast();
  const router = useRouter();
  const may = (permission: Parameters<typeof mayInProject>[1]) => mayInProject(project.role, permission);

  function copy() {
    duplicate.mutate(project.id, {
      onSuccess: (made) =>
        toast({
          kind: 'ok',
          text: `“${made.name}” made.`,
          action: { label: 'Open', run: () => router.push(`/projects/${made.id}`) },
        }),
      onError: (error) => toast({ kind: 'error', text: `Not duplicated. ${sentenceOf(error)}` }),
    });
  }

  return (
    <>
      <Menu
        trigger={
          <IconButton
            icon="more"
            label={`More for ${project.name}`}
            tooltip="none"
            size="small"
            className="relative z-10 -mt-0.5 -mr-1.5"
          />
        }
      >
        <MenuItem asChild>
          <Link href={`/projects/${project.id}`}>
            <Icon name="board" size={18} /> Open
          </Link>
        </MenuItem>
        {may('project.edit') ? (
          <MenuItem icon="pencil" onSelect={() => setRenaming(true)}>
            Rename …
          </MenuItem>
        ) : null}
        {may('project.duplicate') ? (
          <MenuItem icon="copy" disabled={duplicate.isPending} onSelect={copy}>
            Duplicate
          </MenuItem>
        ) : null}
        {may('project.delete') ? (
          <>
            <MenuRule />
            <MenuItem icon="trash" danger onSelect={onDelete}>
              Delete
            </MenuItem>
          </>
        ) : null}
      </Menu>
      {renaming ? <RenameDialog project={project} onClose={() => setRenaming(false)} /> : null}
    </>
  );
}

function commentCount(count: number): string {
  return count === 1 ? '1 open comment' : `${count} open comments`;
}
