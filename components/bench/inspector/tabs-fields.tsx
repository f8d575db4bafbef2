'use client';

import { Checkbox } from '@/components/ui/checkbox';
import { SelectField } from '@/components/ui/select';
import { Table, TableCell, TableHead, TableRow } from '@/components/ui/table';
import { Tag } from '@/components/ui/tag';
import type { CutOf } from '@/lib/job/cut-schema';
import { formatLength, lengthWithUnit } from '@/lib/job/format-length';
import type { Job } from '@/lib/job/job-schema';
import { useBench } from '../bench-context';
import { LengthField } from '../length-field';
import { useSetCutField } from './field-of-cut';

const FIRST_TABS = {
  length: 8,
  height: 'auto',
  hold: 3,
  slope: 90,
  placement: { type: 'count', count: 4 },
} as const;

/** What holds the part: how many tabs, how long and high, and the wood that is really left in each. */
export function TabsFields({ job, cut }: { job: Job; cut: CutOf<'profile'> }) {
  const { readOnly, planning } = useBench();
  const set = useSetCutField(job, cut, 'tabs');
  const { tabs } = cut;
  return (
    <section className="grid gap-2" aria-labelledby="tabs-heading">
      <h3 id="tabs-heading" className="text-lg">
        Tabs
      </h3>
      <Checkbox
        label="Leave tabs that hold the part"
        checked={tabs !== null}
        disabled={readOnly}
        onChange={(event) => set('tabs', event.currentTarget.checked ? FIRST_TABS : null)}
      />
      {tabs ? (
        <>
          <PlacementFields job={job} cut={cut} />
          <LengthField
            label="Length"
            value={tabs.length}
            unit={job.display}
            disabled={readOnly}
            onCommit={(next) => set('tabs.length', next)}
          />
          <LengthField
            label="Height"
            value={tabs.height}
            unit={job.display}
            words={['auto']}
            hint={heightHint(job, cut.id, tabs.height, planning)}
            disabled={readOnly}
            onCommit={(next) => set('tabs.height', next)}
          />
          <LengthField
            label="Wood to hold"
            value={tabs.hold}
            unit={job.display}
            disabled={readOnly}
            onCommit={(next) => set('tabs.hold', next)}
          />
          <LengthField
            label="Slope of the ends"
            value={tabs.slope}
            unit="deg"
            disabled={readOnly}
            onCommit={(next) => set('tabs.slope', next)}
          />
          <TabTable job={job} cut={cut} />
        </>
      ) : null}
    </section>
  );
}

function PlacementFields({ job, cut }: { job: Job; cut: CutOf<'profile'> }) {
  const { readOnly } = useBench();
  const set = useSetCutField(job, cut, 'placement of tabs');
  const placement = cut.tabs?.placement;
  if (!placement) return null;
  return (
    <>
      <SelectField
        layout="row"
        label="Placed"
        value={placement.type}
        disabled={readOnly}
        onChange={(event) =>
          set(
            'tabs.placement',
            event.currentTarget.value === 'count'
              ? { type: 'count', count: 4 }
              : { type: 'spacing', spacing: 120 },
          )
        }
      >
        <option value="count">evenly, so many</option>
        <option value="spacing">evenly, so far apart</option>
        {placement.type === 'at' ? <option value="at">where they were put</option> : null}
      </SelectField>
      {placement.type === 'count' ? (
        <LengthField
          label="How many"
          value={placement.count}
          unit="count"
          disabled={readOnly}
          onCommit={(next) => set('tabs.placement.count', next)}
        />
      ) : null}
      {placement.type === 'spacing' ? (
        <LengthField
          label="Apart"
          value={placement.spacing}
          unit={job.display}
          disabled={readOnly}
          onCommit={(next) => set('tabs.placement.spacing', next)}
        />
      ) : null}
    </>
  );
}

/** Why an automatic height is what it is, or what a fixed one means. */
function heightHint(
  job: Job,
  cutId: string,
  height: number | 'auto',
  planning: ReturnType<typeof useBench>['planning'],
): string {
  const places = planning.tabs.filter(({ cut }) => cut === cutId);
  if (height !== 'auto') return 'Above the far face. Write ‘auto’ to have it worked out.';
  if (places.length === 0) return 'Worked out from what the far face’s cuts take away.';
  const highest = places.reduce((best, place) => (place.height > best.height ? place : best));
  const [top = 0, farDepth = 0] = [highest.height, highest.farDepth].map((mm) => Number(mm.toFixed(1)));
  if (farDepth <= 0) return `${lengthWithUnit(top, job.display)}: the far face is not cut there.`;
  return `${lengthWithUnit(top, job.display)}: clears what the far face’s cuts take (${formatLength(farDepth, job.display)}).`;
}

function TabTable({ job, cut }: { job: Job; cut: CutOf<'profile'> }) {
  const { planning } = useBench();
  const rows = planning.report?.cuts.find(({ id }) => id === cut.id)?.tabs ?? [];
  if (rows.length === 0)
    return (
      <p className="text-graphite">
        {planning.stage === 'planning'
          ? 'Working out the wood that is left…'
          : 'No tab fits on this outline.'}
      </p>
    );
  return (
    <Table
      caption="Wood left in each tab"
      className={planning.current ? '' : 'opacity-55'}
      head={
        <tr>
          <TableHead>Tab</TableHead>
          <TableHead>Wood left</TableHead>
          <TableHead>Section</TableHead>
          <TableHead>Holds</TableHead>
        </tr>
      }
    >
      {rows.map((tab, index) => (
        <TableRow key={index}>
          <TableCell figure>{index + 1}</TableCell>
          <TableCell figure>{lengthWithUnit(tab.wood.height, job.display)}</TableCell>
          <TableCell figure>{Math.round(tab.wood.area)} mm²</TableCell>
          <TableCell>{tab.holds ? <Tag tone="ok">yes</Tag> : <Tag tone="error">no</Tag>}</TableCell>
        </TableRow>
      ))}
    </Table>
  );
}
