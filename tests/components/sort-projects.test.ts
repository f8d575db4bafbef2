import { expect, it } from 'vitest';
import { sortProjects, type ProjectSort } from '@/components/projects/sort-projects';
import type { ProjectItem } from '@/lib/contracts/project';

function item(name: string, size: number, createdAt: string, updatedAt: string): ProjectItem {
  return {
    id: `id-${name}`,
    name,
    state: 'draft',
    role: 'owner',
    owner: { id: 'me', name: 'Me' },
    board: { x: size, y: size, z: 18 },
    material: '',
    pictures: { A: '', B: '' },
    openComments: 0,
    createdAt,
    updatedAt,
  };
}

const items = [
  item('Peg 10', 60, '2031-01-02T00:00:00Z', '2031-01-09T00:00:00Z'),
  item('lid', 200, '2031-01-03T00:00:00Z', '2031-01-04T00:00:00Z'),
  item('Peg 2', 60, '2031-01-01T00:00:00Z', '2031-01-10T00:00:00Z'),
];

it.each<[ProjectSort, string[]]>([
  ['changed', ['Peg 2', 'Peg 10', 'lid']],
  ['made', ['lid', 'Peg 10', 'Peg 2']],
  ['name', ['lid', 'Peg 2', 'Peg 10']],
  ['size', ['lid', 'Peg 2', 'Peg 10']],
])('sorts by %s, equal ones by name', (sort, names) => {
  expect(sortProjects(items, sort).map(({ name }) => name)).toEqual(names);
  expect(sortProjects([...items].reverse(), sort).map(({ name }) => name)).toEqual(names);
});
