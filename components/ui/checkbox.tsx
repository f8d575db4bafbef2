'use client';

import { useId, type InputHTMLAttributes, type ReactNode } from 'react';
import { classNames } from './class-names';

interface CheckboxProps extends Omit<InputHTMLAttributes<HTMLInputElement>, 'type' | 'className'> {
  readonly label: ReactNode;
  readonly hint?: ReactNode;
  readonly className?: string;
}

/** Yes or no, with its sentence. */
export function Checkbox({ label, hint, className, ...input }: CheckboxProps) {
  const id = useId();
  return (
    <div className={classNames('grid grid-cols-[auto_1fr] gap-x-2.5 touch:py-2', className)}>
      <input
        id={id}
        type="checkbox"
        {...input}
        {...(hint ? { 'aria-describedby': `${id}-hint` } : {})}
        className="mt-0.5 size-5 cursor-pointer accent-primary"
      />
      <label htmlFor={id} className="cursor-pointer">
        {label}
      </label>
      {hint ? (
        <p id={`${id}-hint`} className="col-start-2 text-sm text-graphite">
          {hint}
        </p>
      ) : null}
    </div>
  );
}
