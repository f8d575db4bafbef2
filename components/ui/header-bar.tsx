import type { ReactNode } from 'react';

interface HeaderBarProps {
  /** Mark, name, where one is. */
  readonly start: ReactNode;
  readonly centre?: ReactNode;
  readonly end?: ReactNode;
}

/** The bar along the top of every screen; the bench puts its face switch in the middle. */
export function HeaderBar({ start, centre, end }: HeaderBarProps) {
  return (
    <header className="bg-bar text-bar-on print:hidden">
      <div className="flex min-h-14 items-center gap-x-4 px-3 sm:px-5">
        <div className="flex min-w-0 flex-1 items-center gap-3">{start}</div>
        {centre}
        <div className="flex flex-1 items-center justify-end gap-1 sm:gap-2">{end}</div>
      </div>
    </header>
  );
}
