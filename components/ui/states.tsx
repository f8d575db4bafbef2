'use client';

import type { ReactNode } from 'react';
import { Button } from './button';
import { Spinner } from './spinner';

interface StateProps {
  readonly title: string;
  readonly children?: ReactNode;
  readonly actions?: ReactNode;
  /** Heading level that fits where it stands. */
  readonly level?: 1 | 2 | 3;
}

/** Nothing here yet: says what would be here and offers the ways to begin. */
export function EmptyState(props: StateProps) {
  return <StateSheet {...props} drawing={<BlankBoard />} />;
}

/** Something went wrong: what, and what to do. `onRetry` puts the button there. */
export function ErrorState({ onRetry, actions, ...props }: StateProps & { onRetry?: () => void }) {
  const retry = onRetry ? (
    <Button variant="primary" icon="undo" onClick={onRetry}>
      Try again
    </Button>
  ) : null;
  return (
    <div role="alert">
      <StateSheet
        {...props}
        actions={
          retry || actions ? (
            <>
              {retry}
              {actions}
            </>
          ) : undefined
        }
        drawing={<SplitBoard />}
      />
    </div>
  );
}

/** Not for this account, or not there: the two look alike on purpose. */
export function NoPermissionState(props: StateProps) {
  return <StateSheet {...props} drawing={<ClampedBoard />} />;
}

/** Waiting for the first answer; for things whose shape is known use `Skeleton` instead. */
export function LoadingState({ title }: { title: string }) {
  return (
    <div role="status" className="flex items-center justify-center gap-3 px-6 py-16 text-lg text-graphite">
      <Spinner size={24} />
      {title}
    </div>
  );
}

function StateSheet({ title, children, actions, drawing, level = 2 }: StateProps & { drawing: ReactNode }) {
  const Heading = `h${level}` as const;
  return (
    <section className="mx-auto grid max-w-xl justify-items-center gap-3 px-6 py-12 text-center">
      {drawing}
      <Heading className="text-2xl">{title}</Heading>
      {children ? <div className="text-lg text-pretty text-graphite">{children}</div> : null}
      {actions ? <div className="flex flex-wrap justify-center gap-2 pt-2">{actions}</div> : null}
    </section>
  );
}

const frame = { width: 208, height: 96, viewBox: '0 0 208 96', fill: 'none', 'aria-hidden': true } as const;

function BlankBoard() {
  return (
    <svg {...frame} className="stroke-graphite">
      <rect x="24" y="24" width="160" height="48" className="fill-sheet stroke-ink" strokeWidth="1.5" />
      <path d="M10 48h188M104 12v72" strokeDasharray="14 4 3 4" />
    </svg>
  );
}

function SplitBoard() {
  return (
    <svg {...frame} className="stroke-ink" strokeWidth="1.5">
      <path d="M24 24h74l-8 15 11 12-6 21H24z" className="fill-sheet" />
      <path d="M112 26h72v48h-78l7-21-10-12z" className="fill-sheet" />
      <path
        d="M34 62l28-28M54 62l28-28M122 64l28-28M142 64l28-28"
        className="stroke-graphite"
        strokeWidth="1"
      />
    </svg>
  );
}

function ClampedBoard() {
  return (
    <svg {...frame} className="stroke-ink" strokeWidth="1.5">
      <rect x="24" y="40" width="160" height="28" className="fill-sheet" />
      <path d="M12 72h184" />
      <path d="M14 72V30h34v10M194 72V30h-34v10" />
      <path d="M31 22v8M177 22v8M24 22h14M170 22h14" />
      <path d="M96 48h16v12H96zM99.5 48v-3.500a4.5 4.5 0 0 1 9 0V48" strokeWidth="1.25" />
    </svg>
  );
}
