'use client';

import { useEffect, useState } from 'react';
import { Button } from '@/components/ui/button';
import { useBench } from './bench-context';

/** Quick plans need no bar; longer ones show how far they are and can be stopped. */
const PATIENCE = 500;

export function PlanProgress() {
  const { planning } = useBench();
  const isLong = useLong(planning.stage === 'planning');
  if (planning.stage === 'stopped') {
    return (
      <Bar>
        Planning was stopped.{' '}
        <Button size="small" onClick={planning.retry}>
          Plan again
        </Button>
      </Bar>
    );
  }
  if (planning.stage !== 'planning' || !isLong) return null;
  const share = planning.progress?.share ?? 0;
  return (
    <Bar>
      <progress className="w-32 accent-primary" max={1} value={share} aria-label="Planning" />
      <span>{planning.progress?.what ?? 'Planning'}…</span>
      <Button size="small" onClick={planning.cancel}>
        Stop
      </Button>
    </Bar>
  );
}

function Bar({ children }: { children: React.ReactNode }) {
  return (
    <div
      role="status"
      className="absolute top-3 left-1/2 z-20 flex -translate-x-1/2 items-center gap-3 rounded border border-rule bg-sheet px-3 py-1.5"
    >
      {children}
    </div>
  );
}

/** Whether `running` has held for longer than a moment. */
function useLong(running: boolean): boolean {
  const [long, setLong] = useState(false);
  useEffect(() => {
    if (!running) return;
    const timer = setTimeout(() => setLong(true), PATIENCE);
    return () => {
      clearTimeout(timer);
      setLong(false);
    };
  }, [running]);
  return long;
}
