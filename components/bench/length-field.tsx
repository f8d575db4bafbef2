'use client';

import { useState, type KeyboardEvent } from 'react';
import { TextField } from '@/components/ui/field';
import { formatLength, plainNumber } from '@/lib/job/format-length';
import { MM_PER_INCH, parseLength, type FieldUnit } from '@/lib/job/parse-length';

interface LengthFieldProps {
  readonly label: string;
  /** mm, degrees or a plain number; a word of `words`; null where several things differ. */
  readonly value: number | string | null;
  readonly unit: FieldUnit;
  /** Words that may stand instead of a figure: `through`, `auto`. */
  readonly words?: readonly string[];
  readonly hint?: string;
  readonly disabled?: boolean;
  /** Takes the new value; gives a sentence where it cannot be. */
  readonly onCommit: (value: number | string) => string | null;
  readonly autoFocus?: boolean;
}

/**
 * A figure that takes units and sums: `1/4in`, `3/4 + 1/16 in`, `+0.2`. Enter or leaving the field takes it, Escape
 * brings the old one back; what cannot be read keeps the old value and says why. Arrow keys step by 1, with Alt by 0.1,
 * with Shift by 10.
 */
export function LengthField(props: LengthFieldProps) {
  const { label, value, unit, words = [], hint, disabled, onCommit, autoFocus } = props;
  const [text, setText] = useState<string | null>(null);
  const [error, setError] = useState<string | null>(null);
  const shown = text ?? shownValue(value, unit);

  const take = (): void => {
    if (text === null) return;
    const read = readValue(text, unit, value, words);
    if (typeof read === 'object') return setError(read.problem);
    const refusal = read === value ? null : onCommit(read);
    setError(refusal);
    if (refusal === null) setText(null);
  };
  const onKeyDown = (event: KeyboardEvent<HTMLInputElement>): void => {
    if (event.key === 'Enter') take();
    else if (event.key === 'Escape' && text !== null) {
      event.stopPropagation();
      setText(null);
      setError(null);
    } else if ((event.key === 'ArrowUp' || event.key === 'ArrowDown') && typeof value === 'number') {
      event.preventDefault();
      const step = stepOf(unit, event) * (event.key === 'ArrowUp' ? 1 : -1);
      setText(null);
      setError(onCommit(Number((value + step).toFixed(6))));
    }
  };

  return (
    <TextField
      layout="row"
      figure
      label={label}
      value={shown}
      placeholder={value === null ? 'differs' : ''}
      {...(unitMark(unit, shown, words) ? { unit: unitMark(unit, shown, words) } : {})}
      {...(error ? { error } : hint ? { hint } : {})}
      disabled={disabled ?? false}
      autoFocus={autoFocus ?? false}
      autoComplete="off"
      spellCheck={false}
      inputMode={words.length > 0 ? 'text' : 'decimal'}
      onFocus={(event) => event.currentTarget.select()}
      onChange={(event) => setText(event.currentTarget.value)}
      onBlur={take}
      onKeyDown={onKeyDown}
    />
  );
}

function shownValue(value: number | string | null, unit: FieldUnit): string {
  if (value === null) return '';
  if (typeof value === 'string') return value;
  return unit === 'mm' || unit === 'in' ? formatLength(value, unit) : plainNumber(value, 3);
}

function readValue(
  text: string,
  unit: FieldUnit,
  before: number | string | null,
  words: readonly string[],
): number | string | { problem: string } {
  const word = words.find((candidate) => candidate === text.trim().toLowerCase());
  if (word) return word;
  const read = parseLength(text, unit, typeof before === 'number' ? before : undefined);
  if (read.ok) return Number(read.value.toFixed(6));
  const or = words.length > 0 ? ` Or write ${words.map((one) => `'${one}'`).join(' or ')}.` : '';
  return { problem: read.error + or };
}

function stepOf(unit: FieldUnit, { altKey, shiftKey }: KeyboardEvent): number {
  const one = unit === 'in' ? MM_PER_INCH / 16 : 1;
  return altKey ? one / 10 : shiftKey ? one * 10 : one;
}

function unitMark(unit: FieldUnit, shown: string, words: readonly string[]): string {
  if (unit === 'count' || words.includes(shown)) return '';
  return unit === 'deg' ? '°' : unit;
}
