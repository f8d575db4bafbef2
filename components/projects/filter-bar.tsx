'use client';

import { useId } from 'react';
import { classNames } from '@/components/ui/class-names';
import { controlClass } from '@/components/ui/field';
import { Icon } from '@/components/ui/icon';
import { SelectField } from '@/components/ui/select';
import { PROJECT_STATES, type ProjectState } from '@/lib/contracts/project';
import { stateWords } from './project-words';
import type { ProjectSort } from './sort-projects';

export interface ListFilter {
  readonly search: string;
  readonly state: ProjectState | null;
  readonly sort: ProjectSort;
}

const sorts: readonly { readonly value: ProjectSort; readonly label: string }[] = [
  { value: 'changed', label: 'last changed first' },
  { value: 'made', label: 'newest first' },
  { value: 'name', label: 'by name' },
  { value: 'size', label: 'largest board first' },
];

interface FilterBarProps {
  readonly filter: ListFilter;
  readonly onChange: (filter: ListFilter) => void;
}

export function FilterBar({ filter, onChange }: FilterBarProps) {
  const id = useId();
  return (
    <search className="grid grid-cols-2 gap-3 sm:flex">
      <div className="relative col-span-2 sm:w-80">
        <label htmlFor={id} className="sr-only">
          Search the projects by name
        </label>
        <Icon
          name="search"
          size={18}
          className="pointer-events-none absolute inset-y-0 left-3 my-auto text-graphite"
        />
        <input
          id={id}
          type="search"
          placeholder="Search by name"
          value={filter.search}
          onChange={({ target }) => onChange({ ...filter, search: target.value })}
          className={classNames(controlClass, 'pl-10')}
        />
      </div>
      <SelectField
        label="State"
        hideLabel
        className="sm:w-40"
        value={filter.state ?? ''}
        onChange={({ target }) =>
          onChange({ ...filter, state: (target.value || null) as ProjectState | null })
        }
      >
        <option value="">any state</option>
        {PROJECT_STATES.map((state) => (
          <option key={state} value={state}>
            {stateWords[state].label}
          </option>
        ))}
      </SelectField>
      <SelectField
        label="Order"
        hideLabel
        className="sm:w-48"
        value={filter.sort}
        onChange={({ target }) => onChange({ ...filter, sort: target.value as ProjectSort })}
      >
        {sorts.map(({ value, label }) => (
          <option key={value} value={value}>
            {label}
          </option>
        ))}
      </SelectField>
    </search>
  );
}
