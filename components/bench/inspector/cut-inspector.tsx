'use client';

import { Button, IconButton } from '@/components/ui/button';
import { Checkbox } from '@/components/ui/checkbox';
import { TextField } from '@/components/ui/field';
import { SelectField } from '@/components/ui/select';
import { deleteCut, duplicateCut, moveCut } from '@/lib/editor/edits/edit-cuts';
import { cuttersFor } from '@/lib/editor/edits/new-cut';
import type { Cut } from '@/lib/job/cut-schema';
import { clockTime, formatLength } from '@/lib/job/format-length';
import type { Job } from '@/lib/job/job-schema';
import { useBench } from '../bench-context';
import { FindingList } from '../finding-list';
import { COMMON_FIELDS, CUT_FIELDS } from './cut-fields';
import { FieldOfCut, useSetCutField } from './field-of-cut';
import { OutlinesOfCut } from './outlines-of-cut';
import { TabsFields } from './tabs-fields';

/** All that is decided of one cut. */
export function CutInspector({ job, cut }: { job: Job; cut: Cut }) {
  const { planning, readOnly } = useBench();
  const fields = [...CUT_FIELDS[cut.kind], ...COMMON_FIELDS];
  const report = planning.report?.cuts.find(({ id }) => id === cut.id);
  const findings = planning.report?.findings.filter((finding) => finding.cut === cut.id) ?? [];
  return (
    <div className="grid gap-4">
      <CutHead job={job} cut={cut} />
      <section className="grid gap-2" aria-label="What is cut">
        <CutterField job={job} cut={cut} />
        {fields
          .filter(({ more }) => !more)
          .map((field) => (
            <FieldOfCut key={field.key} job={job} cut={cut} field={field} />
          ))}
      </section>
      {cut.kind === 'profile' ? <TabsFields job={job} cut={cut} /> : null}
      <FindingList findings={findings} />
      <OutlinesOfCut job={job} cut={cut} />
      <details>
        <summary className="lettering text-lg">More</summary>
        <div className="grid gap-2 pt-2">
          {fields
            .filter(({ more }) => more)
            .map((field) => (
              <FieldOfCut key={field.key} job={job} cut={cut} field={field} />
            ))}
        </div>
      </details>
      {report ? (
        <p className="figure text-sm text-graphite">
          {clockTime(report.seconds)} min · {formatLength(Math.round(report.cutLength), 'mm')} mm cut ·{' '}
          {formatLength(Math.round(report.removed / 10) / 100, 'mm')} cm³ of wood
        </p>
      ) : null}
      {readOnly ? null : <CutActions job={job} cut={cut} />}
    </div>
  );
}

function CutHead({ job, cut }: { job: Job; cut: Cut }) {
  const { readOnly } = useBench();
  const set = useSetCutField(job, cut, 'name');
  const enable = useSetCutField(job, cut, cut.enabled ? 'leave out' : 'take up again');
  return (
    <div className="grid gap-2">
      <TextField
        label="Name of the cut"
        hideLabel
        key={`${cut.id} ${cut.name}`}
        defaultValue={cut.name}
        readOnly={readOnly}
        inputClassName="font-heading text-xl font-semibold"
        onBlur={(event) => event.currentTarget.value !== cut.name && set('name', event.currentTarget.value)}
      />
      <p className="text-graphite">
        {cut.kind} on face {cut.face}
      </p>
      <Checkbox
        label="Is cut"
        checked={cut.enabled}
        disabled={readOnly}
        onChange={(event) => enable('enabled', event.currentTarget.checked)}
      />
    </div>
  );
}

function CutterField({ job, cut }: { job: Job; cut: Cut }) {
  const { readOnly } = useBench();
  const set = useSetCutField(job, cut, 'cutter');
  return (
    <SelectField
      layout="row"
      label="Cutter"
      value={cut.cutter}
      disabled={readOnly}
      onChange={(event) => set('cutter', event.currentTarget.value)}
    >
      {cuttersFor(job, cut.kind).map(({ id, name, number }) => (
        <option key={id} value={id}>
          {number} · {name}
        </option>
      ))}
    </SelectField>
  );
}

function CutActions({ job, cut }: { job: Job; cut: Cut }) {
  const { editor } = useBench();
  const name = cut.name || cut.id;
  return (
    <div className="flex flex-wrap gap-2 border-t border-rule pt-3">
      <IconButton
        icon="arrow-left"
        label="Do it earlier"
        onClick={() => editor.apply(`Do ${name} earlier`, moveCut(job, cut.id, -1))}
      />
      <IconButton
        icon="arrow-right"
        label="Do it later"
        onClick={() => editor.apply(`Do ${name} later`, moveCut(job, cut.id, 1))}
      />
      <Button
        size="small"
        icon="copy"
        onClick={() => {
          const copy = duplicateCut(job, cut.id);
          if (!copy) return;
          editor.apply(`Duplicate ${name}`, copy.job);
          editor.select({ cut: copy.id });
        }}
      >
        Duplicate
      </Button>
      <Button
        size="small"
        icon="trash"
        onClick={() => editor.apply(`Delete ${name}`, deleteCut(job, cut.id))}
      >
        Delete
      </Button>
    </div>
  );
}
