'use client';

import { useState } from 'react';
import { Button } from '@/components/ui/button';
import { TextField, type TextFieldProps } from '@/components/ui/field';

/** A password, hidden until its reader asks to see it. */
export function PasswordField(props: Omit<TextFieldProps, 'type'>) {
  const [seen, setSeen] = useState(false);
  return (
    <div className="relative">
      <TextField {...props} type={seen ? 'text' : 'password'} inputClassName="pr-20" spellCheck={false} />
      <Button
        variant="quiet"
        size="small"
        aria-pressed={seen}
        className="absolute top-6.5 right-0.5 touch:top-6"
        onClick={() => setSeen(!seen)}
      >
        {seen ? 'Hide' : 'Show'}
        <span className="sr-only"> {props.label}</span>
      </Button>
    </div>
  );
}
