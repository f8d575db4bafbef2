'use client';

import { Tabs as Radix } from 'radix-ui';
import type { ReactNode } from 'react';
import { classNames } from './class-names';

interface TabsProps<Value extends string> {
  readonly label: string;
  readonly value: Value;
  readonly onChange: (value: Value) => void;
  readonly pages: readonly {
    readonly value: Value;
    readonly label: ReactNode;
    readonly content: ReactNode;
  }[];
  readonly className?: string;
}

/** Pages of one thing, one shown at a time. (The wood that holds a part is `tab` elsewhere; these are page tabs.) */
export function Tabs<Value extends string>({ label, value, onChange, pages, className }: TabsProps<Value>) {
  return (
    <Radix.Root
      value={value}
      onValueChange={(next) => onChange(next as Value)}
      {...(className ? { className } : {})}
    >
      <Radix.List aria-label={label} className="flex gap-1 overflow-x-auto border-b border-rule">
        {pages.map((page) => (
          <Radix.Trigger
            key={page.value}
            value={page.value}
            className={classNames(
              'lettering -mb-px min-h-control shrink-0 border-b-2 border-transparent px-3 text-lg text-graphite touch:min-h-touch',
              'hover:text-ink data-[state=active]:border-primary data-[state=active]:text-ink',
            )}
          >
            {page.label}
          </Radix.Trigger>
        ))}
      </Radix.List>
      {pages.map((page) => (
        <Radix.Content key={page.value} value={page.value} className="pt-4">
          {page.content}
        </Radix.Content>
      ))}
    </Radix.Root>
  );
}
