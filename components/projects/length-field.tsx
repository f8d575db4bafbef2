'use client';

import { TextField } from '@/components/ui/field';
import { fail, ok, type Result } from '@/lib/base/result';
import { parseLength } from '@/lib/job/parse-length';
import { lengthText } from './board-size';

interface LengthFieldProps {
  readonly label: string;
  readonly text: string;
  readonly unit: 'mm' | 'in';
  readonly onChange: (text: string) => void;
  /** Whether to say what is wrong; not while the field has not been sent yet. */
  readonly checked: boolean;
}

/** A length above zero that may be typed with units and sums; where it is a sum, what it comes to stands beneath. */
export function LengthField({ label, text, unit, onChange, checked }: LengthFieldProps) {
  const length = positiveLength(text, unit);
  const isPlain = /^\s*\d*[.,]?\d*\s*$/.test(text);
  return (
    <TextField
      label={label}
      unit={unit}
      figure
      inputMode="text"
      autoComplete="off"
      value={text}
      onChange={({ target }) => onChange(target.value)}
      {...(checked && !length.ok ? { error: length.error } : {})}
      {...(length.ok && !isPlain ? { hint: `= ${lengthText(length.value, unit)} ${unit}` } : {})}
    />
  );
}

/** Reads a length above zero, in mm; fails with a sentence. */
export function positiveLength(text: string, unit: 'mm' | 'in'): Result<number, string> {
  const length = parseLength(text, unit);
  if (!length.ok) return length;
  return length.value > 0 ? ok(length.value) : fail('It must be more than 0.');
}
