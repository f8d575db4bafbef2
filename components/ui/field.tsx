'use client';

import {
  useId,
  type InputHTMLAttributes,
  type ReactNode,
  type Ref,
  type TextareaHTMLAttributes,
} from 'react';
import { classNames } from './class-names';
import { Icon } from './icon';

/** What a control must carry so that its label, hint and error are read with it. */
export interface ControlProps {
  readonly id: string;
  readonly 'aria-describedby'?: string;
  readonly 'aria-invalid'?: true;
}

export interface FieldProps {
  readonly label: ReactNode;
  readonly hint?: ReactNode;
  /** A sentence that says how to put it right. */
  readonly error?: ReactNode;
  /** `row` sets the label to the left of the control, as an inspector does. */
  readonly layout?: 'stack' | 'row';
  readonly hideLabel?: boolean;
  readonly className?: string;
  readonly children: (control: ControlProps) => ReactNode;
}

/** A label, a control, and beneath it a hint or what is wrong. */
export function Field({ label, hint, error, layout = 'stack', hideLabel, className, children }: FieldProps) {
  const id = useId();
  const noteId = `${id}-note`;
  const note = error ?? hint;
  const control: ControlProps = {
    id,
    ...(note ? { 'aria-describedby': noteId } : {}),
    ...(error ? { 'aria-invalid': true as const } : {}),
  };
  const row = layout === 'row';
  return (
    <div
      className={classNames(
        row ? 'grid grid-cols-[minmax(6rem,2fr)_3fr] items-center gap-x-3' : 'grid gap-1',
        className,
      )}
    >
      <label
        htmlFor={id}
        className={hideLabel ? 'sr-only' : classNames('text-sm', row ? 'text-graphite' : 'font-medium')}
      >
        {label}
      </label>
      {children(control)}
      {note ? (
        <p
          id={noteId}
          className={classNames(
            'flex gap-1.5 text-sm',
            row && 'col-start-2 pt-0.5',
            error ? 'text-error' : 'text-graphite',
          )}
        >
          {error ? <Icon name="error" size={16} className="mt-0.5 shrink-0" /> : null}
          <span>{note}</span>
        </p>
      ) : null}
    </div>
  );
}

/** The looks of everything that is typed into. */
export const controlClass =
  'min-h-control w-full rounded border border-edge bg-well px-3 text-base text-ink placeholder:text-graphite ' +
  'touch:min-h-touch aria-invalid:border-error aria-invalid:border-2 disabled:opacity-55 [&[readonly]]:border-rule';

type Shared = Omit<FieldProps, 'children'>;

export interface TextFieldProps extends Shared, Omit<InputHTMLAttributes<HTMLInputElement>, 'className'> {
  /** Shown behind the figure: `mm`, `min`. */
  readonly unit?: string;
  /** Set in the fixed-width face, for lengths and counts. */
  readonly figure?: boolean;
  readonly inputClassName?: string;
  readonly ref?: Ref<HTMLInputElement>;
}

/** One line of text, a figure, an e-mail address, a password. */
export function TextField(props: TextFieldProps) {
  const { label, hint, error, layout, hideLabel, className, unit, figure, inputClassName, ...input } = props;
  return (
    <Field {...present({ label, hint, error, layout, hideLabel, className })}>
      {(control) => (
        <span className="relative block">
          <input
            type="text"
            {...input}
            {...control}
            className={classNames(controlClass, figure && 'figure', unit && 'pr-12', inputClassName)}
          />
          {unit ? (
            <span className="figure pointer-events-none absolute inset-y-0 right-3 flex items-center text-sm text-graphite">
              {unit}
            </span>
          ) : null}
        </span>
      )}
    </Field>
  );
}

export interface TextAreaProps
  extends Shared, Omit<TextareaHTMLAttributes<HTMLTextAreaElement>, 'className'> {
  readonly ref?: Ref<HTMLTextAreaElement>;
}

/** Several lines of text. */
export function TextArea(props: TextAreaProps) {
  const { label, hint, error, layout, hideLabel, className, ...area } = props;
  return (
    <Field {...present({ label, hint, error, layout, hideLabel, className })}>
      {(control) => <textarea rows={4} {...area} {...control} className={classNames(controlClass, 'py-2')} />}
    </Field>
  );
}

/** Leaves out the keys without a value: optional properties here are either absent or set. */
export function present(field: { [K in keyof Shared]: Shared[K] | undefined }): Shared {
  return Object.fromEntries(
    Object.entries(field).filter(([, value]) => value !== undefined),
  ) as unknown as Shared;
}
