'use client';

import { useEffect, useRef, useState, type KeyboardEvent } from 'react';
import type { Draft } from '@/lib/editor/tools/tool';
import type { Vec } from '@/lib/geometry/vec';
import { formatLength, plainNumber } from '@/lib/job/format-length';
import type { DisplayUnit } from '@/lib/job/job-schema';
import { parseLength } from '@/lib/job/parse-length';

interface LiveSizesProps {
  readonly draft: Extract<Draft, { kind: 'shape' }>;
  /** px in the plan. */
  readonly at: Vec;
  readonly unit: DisplayUnit;
  readonly onSizes: (values: readonly (number | null)[]) => void;
}

/** The sizes of what is being drawn, at the cursor. Tab goes into them; Enter draws it exactly so. */
export function LiveSizes({ draft, at, unit, onSizes }: LiveSizesProps) {
  const [typed, setTyped] = useState<readonly (string | null)[]>([]);
  const [problem, setProblem] = useState<string | null>(null);
  const first = useRef<HTMLInputElement>(null);
  useEffect(() => {
    const onKeyDown = (event: globalThis.KeyboardEvent): void => {
      if (
        event.key !== 'Tab' ||
        first.current?.parentElement?.parentElement?.contains(document.activeElement)
      )
        return;
      event.preventDefault();
      first.current?.focus();
      first.current?.select();
    };
    window.addEventListener('keydown', onKeyDown);
    return () => window.removeEventListener('keydown', onKeyDown);
  }, []);

  const take = (): void => {
    const values: (number | null)[] = [];
    for (const [index, size] of draft.sizes.entries()) {
      const text = typed[index] ?? null;
      const read = text === null ? null : parseLength(text, size.unit === 'deg' ? 'deg' : unit, size.value);
      if (read && !read.ok) return setProblem(read.error);
      values.push(read ? read.value : null);
    }
    setProblem(null);
    setTyped([]);
    first.current?.blur();
    onSizes(values);
  };
  const onKeyDown = (event: KeyboardEvent): void => {
    if (event.key === 'Enter') take();
    if (event.key === 'Escape') {
      setTyped([]);
      setProblem(null);
      (event.target as HTMLElement).blur();
    }
  };
  return (
    <div
      className="absolute z-10 grid gap-1 rounded border border-tab bg-sheet px-2 py-1"
      style={{ left: at.x + 18, top: at.y + 18 }}
      onKeyDown={onKeyDown}
    >
      <div className="flex gap-2">
        {draft.sizes.map(({ label, value, unit: sizeUnit }, index) => (
          <label key={label} className="figure flex items-center gap-1 text-sm">
            {label}
            <input
              ref={index === 0 ? first : null}
              className="w-20 rounded-sm border border-rule bg-well px-1"
              inputMode="decimal"
              value={
                typed[index] ??
                (sizeUnit === 'deg' ? plainNumber(value, 1) : formatLength(Number(value.toFixed(2)), unit))
              }
              onChange={(event) => {
                const text = event.currentTarget.value;
                setTyped(draft.sizes.map((_, i) => (i === index ? text : (typed[i] ?? null))));
              }}
            />
          </label>
        ))}
      </div>
      {problem ? <p className="max-w-60 text-sm text-error">{problem}</p> : null}
    </div>
  );
}
