import { useState, type ChangeEvent } from 'react';
import type { z } from 'zod';
import { ApiError, sentenceOf } from '@/lib/client/api-error';

interface Field {
  readonly value: string;
  readonly onChange: (event: ChangeEvent<HTMLInputElement>) => void;
  readonly error?: string;
}

/**
 * The text of a form's fields, checked against the API's own schema when the form is sent. A field's error goes away as
 * soon as that field is changed; what the server says of a field stands at the field.
 */
export function useFields<Name extends string, Schema extends z.ZodType>(
  schema: Schema,
  empty: Readonly<Record<Name, string>>,
) {
  const [values, setValues] = useState<Readonly<Record<Name, string>>>(empty);
  const [errors, setErrors] = useState<Readonly<Record<string, string>>>({});
  const [general, setGeneral] = useState<string | null>(null);

  function field(name: Name): Field {
    const error = errors[name];
    return {
      value: values[name],
      onChange: ({ target }) => {
        setValues((now) => ({ ...now, [name]: target.value }));
        setErrors((now) => Object.fromEntries(Object.entries(now).filter(([other]) => other !== name)));
      },
      ...(error ? { error } : {}),
    };
  }

  /** The checked values, or null after marking the fields that are wrong. */
  function read(): z.output<Schema> | null {
    const parsed = schema.safeParse(values);
    setGeneral(null);
    if (parsed.success) return parsed.data;
    setErrors(
      Object.fromEntries(
        parsed.error.issues.map(({ path, message }) => [String(path[0]), sentence(message)]),
      ),
    );
    return null;
  }

  /** Puts what a request threw where it belongs: at its field, or above the form. */
  function refuse(error: unknown): void {
    const problems = error instanceof ApiError ? (error.details.problems ?? []) : [];
    const known = problems.filter(({ path }) => path in empty);
    setErrors(Object.fromEntries(known.map(({ path, message }) => [path, sentence(message)])));
    setGeneral(known.length > 0 ? null : sentenceOf(error));
  }

  const clear = () => setValues(empty);
  return { field, read, refuse, clear, general };
}

/** Schemas say `must not be empty`; beneath a field that reads `Must not be empty.` */
function sentence(message: string): string {
  const capital = message.charAt(0).toUpperCase() + message.slice(1);
  return /[.!?]$/.test(capital) ? capital : `${capital}.`;
}
