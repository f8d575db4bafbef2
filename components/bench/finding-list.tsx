'use client';

import { Button } from '@/components/ui/button';
import { Icon } from '@/components/ui/icon';
import { FINDING_CODES } from '@/lib/report/finding-codes';
import type { Finding } from '@/lib/report/report';
import { mendsFor } from '@/lib/editor/mends';
import { useBench, useEditorState } from './bench-context';
import { classNames } from '@/components/ui/class-names';
import { seenJob } from '@/lib/editor/editor-store';

/** What the engine noticed, each with its sentence, its place and the ways to mend it. */
export function FindingList({ findings }: { findings: readonly Finding[] }) {
  if (findings.length === 0) return null;
  return (
    <ul className="grid gap-2" aria-label="Findings">
      {findings.map((finding, index) => (
        <FindingItem key={`${finding.code} ${index}`} finding={finding} />
      ))}
    </ul>
  );
}

function FindingItem({ finding }: { finding: Finding }) {
  const { editor, readOnly } = useBench();
  const job = useEditorState(seenJob);
  const { title, mend } = FINDING_CODES[finding.code];
  const isError = finding.severity === 'error';
  const mends = readOnly ? [] : mendsFor(job, finding);
  return (
    <li
      className={classNames(
        'grid gap-1 rounded border border-l-4 px-3 py-2',
        isError ? 'border-error bg-error-wash' : 'border-warning bg-warning-wash',
      )}
    >
      <p className="flex items-center gap-2 font-medium">
        <Icon name={isError ? 'error' : 'warning'} size={18} />
        <span className="sr-only">{isError ? 'Error: ' : 'Warning: '}</span>
        {title}
      </p>
      <p>{finding.message}</p>
      <p className="text-sm text-graphite">{mend}</p>
      <div className="flex flex-wrap gap-2 pt-1">
        {finding.cut !== undefined || finding.at ? (
          <Button size="small" onClick={() => showFinding(editor, finding)}>
            Show it
          </Button>
        ) : null}
        {mends.map(({ label, job: mended }) => (
          <Button key={label} size="small" variant="primary" onClick={() => editor.apply(label, mended)}>
            {label}
          </Button>
        ))}
      </div>
    </li>
  );
}

/** Turns the leaf to the finding's face, runs the section through its place and selects its cut. */
function showFinding(editor: ReturnType<typeof useBench>['editor'], finding: Finding): void {
  if (finding.face) editor.look({ face: finding.face });
  if (finding.cut !== undefined) editor.select({ cut: finding.cut });
  if (!finding.at) return;
  const [, y] = finding.at;
  const { board } = editor.job();
  editor.look({ section: { from: { x: 0, y }, to: { x: board.x, y } } });
}
