'use client';

import { Checkbox } from '@/components/ui/checkbox';
import { SelectField } from '@/components/ui/select';
import { cuttersFor } from '@/lib/editor/edits/new-cut';
import { setCutField } from '@/lib/editor/edits/edit-cuts';
import type { Cut } from '@/lib/job/cut-schema';
import type { Job } from '@/lib/job/job-schema';
import { useBench } from '../bench-context';
import { LengthField } from '../length-field';
import type { CutField } from './cut-fields';

interface FieldProps {
  readonly job: Job;
  readonly cut: Cut;
  readonly field: CutField;
}

/** One field of a cut: shows its value, takes a new one as a named step, says why where it cannot be. */
export function FieldOfCut({ job, cut, field }: FieldProps) {
  const { readOnly } = useBench();
  const set = useSetCutField(job, cut, field.label);
  const value = valueAt(cut, field.key);
  const note = field.hint ? { hint: field.hint } : {};
  switch (field.type) {
    case 'length':
    case 'depth':
      return (
        <LengthField
          label={field.label}
          value={typeof value === 'number' || typeof value === 'string' ? value : null}
          unit={job.display}
          {...(field.type === 'depth' && cut.kind !== 'taper-engrave' ? { words: ['through'] } : {})}
          {...note}
          disabled={readOnly}
          onCommit={(next) => set(field.key, next)}
        />
      );
    case 'angle':
    case 'count':
    case 'seconds':
      return (
        <LengthField
          label={field.label}
          value={typeof value === 'number' ? value : null}
          unit={field.type === 'angle' ? 'deg' : 'count'}
          {...note}
          disabled={readOnly}
          onCommit={(next) => set(field.key, next)}
        />
      );
    case 'percent':
      return <PercentField job={job} cut={cut} field={field} />;
    case 'switch':
      return (
        <Checkbox
          label={field.label}
          checked={value === true}
          disabled={readOnly}
          onChange={(event) => set(field.key, event.currentTarget.checked)}
        />
      );
    case 'choice':
    case 'pocket':
    case 'flat-cutter':
      return (
        <SelectField
          layout="row"
          label={field.label}
          value={typeof value === 'string' ? value : ''}
          disabled={readOnly}
          onChange={(event) => set(field.key, chosen(field, event.currentTarget.value))}
        >
          {optionsOf(job, cut, field).map((option) => (
            <option key={option.value} value={option.value}>
              {option.label}
            </option>
          ))}
        </SelectField>
      );
  }
}

/** Shown in percent, kept as a share; empty means the cutter's own. */
function PercentField({ job, cut, field }: FieldProps) {
  const { readOnly } = useBench();
  const set = useSetCutField(job, cut, field.label);
  const own = valueAt(cut, field.key);
  const cutter = job.cutters.find(({ id }) => id === cut.cutter);
  const share = typeof own === 'number' ? own : cutter?.speeds.stepover;
  return (
    <LengthField
      label={`${field.label}, %`}
      value={share === undefined ? null : share * 100}
      unit="count"
      {...(field.hint ? { hint: field.hint } : {})}
      disabled={readOnly}
      onCommit={(next) => set(field.key, typeof next === 'number' ? next / 100 : next)}
    />
  );
}

/** Sets a field of the cut as one named step; gives the sentence where it was refused. */
export function useSetCutField(
  job: Job,
  cut: Cut,
  label: string,
): (key: string, value: unknown) => string | null {
  const { editor } = useBench();
  return (key, value) => {
    const result = setCutField(job, cut.id, key, value);
    if (!result.ok) return result.error;
    editor.apply(`Change ${label.toLowerCase()} of ${cut.name || cut.id}`, result.value);
    return null;
  };
}

function optionsOf(job: Job, cut: Cut, field: CutField): readonly { value: string; label: string }[] {
  if (field.type === 'pocket') {
    const before = job.cuts.slice(0, job.cuts.indexOf(cut));
    const pockets = before.filter(({ kind, face }) => kind === 'pocket' && face === cut.face);
    return [
      { value: '', label: 'nothing: cut it all' },
      ...pockets.map(({ id, name }) => ({ value: id, label: name || id })),
    ];
  }
  if (field.type === 'flat-cutter') {
    const flats = cuttersFor(job, 'pocket').filter(({ kind }) => kind === 'flat');
    return [
      { value: '', label: 'the V-bit itself' },
      ...flats.map(({ id, name }) => ({ value: id, label: name })),
    ];
  }
  return field.options ?? [];
}

/** The empty choice: no other cut or cutter is null in the document, a default is left out. */
function chosen(field: CutField, value: string): unknown {
  if (value !== '') return value;
  return field.type === 'choice' ? undefined : null;
}

function valueAt(cut: Cut, key: string): unknown {
  return key
    .split('.')
    .reduce<unknown>((at, part) => (typeof at === 'object' && at ? Reflect.get(at, part) : undefined), cut);
}
