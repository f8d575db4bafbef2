'use client';

import { RadioGroup } from 'radix-ui';
import type { ReactNode } from 'react';
import { classNames } from './class-names';

interface ChoiceProps<Value extends string> {
  /** Names the group to screen readers. */
  readonly label: string;
  readonly value: Value;
  readonly options: readonly {
    readonly value: Value;
    readonly label: ReactNode;
    readonly disabled?: boolean;
  }[];
  readonly onChange: (value: Value) => void;
  readonly className?: string;
}

/** One of a few, all seen at once: millimetres or inches, face A or face B. */
export function Choice<Value extends string>({
  label,
  value,
  options,
  onChange,
  className,
}: ChoiceProps<Value>) {
  return (
    <RadioGroup.Root
      aria-label={label}
      value={value}
      onValueChange={(next) => onChange(next as Value)}
      orientation="horizontal"
      className={classNames('inline-flex rounded border border-edge bg-well', className)}
    >
      {options.map((option) => (
        <RadioGroup.Item
          key={option.value}
          value={option.value}
          disabled={option.disabled ?? false}
          className={classNames(
            'lettering inline-flex min-h-[calc(2.25rem-2px)] flex-1 items-center justify-center gap-1.5 border-r border-edge px-3.5 whitespace-nowrap',
            'last:border-r-0 touch:min-h-touch data-[state=checked]:bg-primary data-[state=checked]:text-primary-on',
            'disabled:opacity-55',
          )}
        >
          {option.label}
        </RadioGroup.Item>
      ))}
    </RadioGroup.Root>
  );
}
