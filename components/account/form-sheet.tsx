import type { ReactNode } from 'react';

interface FormSheetProps {
  readonly title: string;
  readonly children: ReactNode;
  /** The other way: to sign up for those who came to sign in. */
  readonly below: ReactNode;
}

/** A small sheet with one form on it. */
export function FormSheet({ title, children, below }: FormSheetProps) {
  return (
    <div className="grid w-full max-w-md gap-4">
      <section className="grid gap-5 border-2 border-ink bg-sheet p-6 sm:p-8">
        <h1 className="text-3xl">{title}</h1>
        {children}
      </section>
      <p className="text-center">{below}</p>
    </div>
  );
}
