'use client';

import { Tooltip as Radix } from 'radix-ui';
import type { ReactNode } from 'react';

interface TooltipProps {
  readonly text: ReactNode;
  /** A key that does the same, shown beside the words. */
  readonly keys?: string;
  readonly side?: 'top' | 'right' | 'bottom' | 'left';
  readonly children: ReactNode;
}

/** Says what the one child is for, on hover and on focus. Needs the Tooltip provider of the root layout. */
export function Tooltip({ text, keys, side = 'bottom', children }: TooltipProps) {
  return (
    <Radix.Root>
      <Radix.Trigger asChild>{children}</Radix.Trigger>
      <Radix.Portal>
        <Radix.Content
          side={side}
          sideOffset={6}
          collisionPadding={8}
          className="z-50 flex max-w-72 items-center gap-2 rounded bg-ink px-2.5 py-1 text-sm text-sheet"
        >
          {text}
          {keys ? <kbd className="figure border-l border-graphite pl-2 text-sm">{keys}</kbd> : null}
        </Radix.Content>
      </Radix.Portal>
    </Radix.Root>
  );
}

export const TooltipProvider = Radix.Provider;
