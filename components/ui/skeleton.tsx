import { classNames } from './class-names';

/** The place of something that is on its way, in its size. Put `aria-busy` and a word on what holds it. */
export function Skeleton({ className }: { className?: string }) {
  return (
    <span
      aria-hidden
      className={classNames('block animate-pulse rounded-sm bg-rule', className ?? 'h-4 w-full')}
    />
  );
}
