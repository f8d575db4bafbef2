'use client';

import type { ReactNode, Ref, SelectHTMLAttributes } from 'react';
import { classNames } from './class-names';
import { controlClass, Field, present, type FieldProps } from './field';
import { Icon } from './icon';

export interface SelectFieldProps
  extends Omit<FieldProps, 'children'>, Omit<SelectHTMLAttributes<HTMLSelectElement>, 'className'> {
  readonly children: ReactNode;
  readonly ref?: Ref<HTMLSelectElement>;
}

/** One of a list. The device's own list: it works with a keyboard, a finger and a screen reader as people know it. */
export function SelectField(props: SelectFieldProps) {
  const { label, hint, error, layout, hideLabel, className, children, ...select } = props;
  return (
    <Field {...present({ label, hint, error, layout, hideLabel, className })}>
      {(control) => (
        <span className="relative block">
          <select {...select} {...control} className={classNames(controlClass, 'appearance-none pr-9')}>
            {children}
          </select>
          <Icon
            name="chevron-down"
            size={18}
            className="pointer-events-none absolute inset-y-0 right-2.5 my-auto text-graphite"
          />
        </span>
      )}
    </Field>
  );
}
