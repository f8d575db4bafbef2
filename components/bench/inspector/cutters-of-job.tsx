'use client';

import { useQuery } from '@tanstack/react-query';
import { Button, IconButton } from '@/components/ui/button';
import { Menu, MenuItem, MenuLabel } from '@/components/ui/menu';
import { callApi } from '@/lib/client/call-api';
import { sentenceOf } from '@/lib/client/api-error';
import { ENDPOINTS } from '@/lib/contracts/endpoints';
import { addCutter, deleteCutter } from '@/lib/editor/edits/edit-cutters';
import { lengthWithUnit } from '@/lib/job/format-length';
import type { Job } from '@/lib/job/job-schema';
import type { Cutter } from '@/lib/job/machine-schema';
import { useBench } from '../bench-context';

const KIND_WORDS: Readonly<Record<Cutter['kind'], string>> = {
  flat: 'flat',
  ball: 'ball',
  vbit: 'V-bit',
  drill: 'drill',
};

/** The cutters that this job may use, taken over from the shop's list. */
export function CuttersOfJob({ job }: { job: Job }) {
  const { editor, readOnly, say } = useBench();
  return (
    <section className="grid gap-2" aria-labelledby="cutters-heading">
      <h3 id="cutters-heading" className="text-lg">
        Cutters
      </h3>
      {job.cutters.length === 0 ? (
        <p className="text-graphite">This job has no cutter yet. Take one from the shop’s list.</p>
      ) : null}
      <ul>
        {job.cutters.map((cutter) => (
          <li key={cutter.id} className="flex items-center gap-2 border-b border-rule py-1">
            <span className="figure w-8 text-graphite">{cutter.number}</span>
            <span className="grow">
              {cutter.name}
              <span className="block text-sm text-graphite">{describeCutter(cutter, job)}</span>
            </span>
            {readOnly ? null : (
              <IconButton
                size="small"
                icon="close"
                label={`Take ${cutter.name} out of this job`}
                onClick={() => {
                  const next = deleteCutter(job, cutter.id);
                  if (next.ok) editor.apply(`Take out ${cutter.name}`, next.value);
                  else say(next.error);
                }}
              />
            )}
          </li>
        ))}
      </ul>
      {readOnly ? null : <ShopCutterMenu job={job} />}
    </section>
  );
}

function ShopCutterMenu({ job }: { job: Job }) {
  const { editor } = useBench();
  const shop = useQuery({
    queryKey: ['shop-cutters'],
    queryFn: ({ signal }) => callApi(ENDPOINTS.listShopCutters, {}, { signal }),
  });
  if (shop.isPending) return <p className="text-graphite">Looking into the shop’s list…</p>;
  if (shop.isError) return <p className="text-error">{sentenceOf(shop.error)}</p>;
  const offered = shop.data.items.filter(({ cutter }) => !job.cutters.some(({ id }) => id === cutter.id));
  if (offered.length === 0) return <p className="text-graphite">All cutters of the shop’s list are here.</p>;
  return (
    <Menu
      align="start"
      trigger={
        <Button size="small" icon="plus">
          From the shop’s list
        </Button>
      }
    >
      <MenuLabel>Cutters of the shop</MenuLabel>
      {offered.map(({ id, cutter }) => (
        <MenuItem key={id} onSelect={() => editor.apply(`Take ${cutter.name}`, addCutter(job, cutter))}>
          {cutter.name}
        </MenuItem>
      ))}
    </Menu>
  );
}

function describeCutter(cutter: Cutter, job: Job): string {
  const angle = cutter.kind === 'vbit' || cutter.kind === 'drill' ? `, ${cutter.angle}°` : '';
  return `${KIND_WORDS[cutter.kind]}, ${lengthWithUnit(cutter.diameter, job.display)}${angle}`;
}
