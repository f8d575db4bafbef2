import type { ProjectItem } from '@/lib/contracts/project';

export const SORTS = ['changed', 'made', 'name', 'size'] as const;
export type ProjectSort = (typeof SORTS)[number];

type Compare = (a: ProjectItem, b: ProjectItem) => number;

const letters = new Intl.Collator('en', { numeric: true, sensitivity: 'base' });
const area = ({ board }: ProjectItem) => board.x * board.y;

const compare: Record<ProjectSort, Compare> = {
  changed: (a, b) => b.updatedAt.localeCompare(a.updatedAt),
  made: (a, b) => b.createdAt.localeCompare(a.createdAt),
  name: (a, b) => letters.compare(a.name, b.name),
  size: (a, b) => area(b) - area(a),
};

/** Newest change first, newest first, by name (2 before 10), or the largest board first; equal ones by name, then id. */
export function sortProjects(items: readonly ProjectItem[], sort: ProjectSort): ProjectItem[] {
  return [...items].sort(
    (a, b) => compare[sort](a, b) || letters.compare(a.name, b.name) || a.id.localeCompare(b.id),
  );
}
