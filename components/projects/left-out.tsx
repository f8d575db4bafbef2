import { Notice } from '@/components/ui/notice';
import type { Drawing } from './drawing';

/** Says what was taken from the file and, item by item, what was not and where it stands. */
export function LeftOut({ drawing: { outlines, leftOut } }: { drawing: Drawing }) {
  const taken = outlines.length === 1 ? '1 outline taken.' : `${outlines.length} outlines taken.`;
  if (leftOut.length === 0) return <Notice kind="ok">{taken} Nothing was left out.</Notice>;
  return (
    <Notice kind="warning" title={`${taken} ${leftOut.length} left out:`}>
      <ul className="max-h-40 overflow-y-auto" tabIndex={0} aria-label="What was left out">
        {leftOut.map(({ what, where }, i) => (
          <li key={i}>
            {what} <span className="figure text-sm text-graphite">{where}</span>
          </li>
        ))}
      </ul>
    </Notice>
  );
}
