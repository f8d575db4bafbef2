'use client';

import { useEffect, useState } from 'react';

/** Whether the space bar is down: while it is, dragging moves the sheet. */
export function useSpaceHeld(): boolean {
  const [held, setHeld] = useState(false);
  useEffect(() => {
    const onKey = (event: KeyboardEvent): void => {
      if (event.code !== 'Space') return;
      const isField =
        event.target instanceof HTMLElement && event.target.closest('input, textarea, select, button, a');
      if (isField) return;
      event.preventDefault();
      setHeld(event.type === 'keydown');
    };
    const release = (): void => setHeld(false);
    window.addEventListener('keydown', onKey);
    window.addEventListener('keyup', onKey);
    window.addEventListener('blur', release);
    return () => {
      window.removeEventListener('keydown', onKey);
      window.removeEventListener('keyup', onKey);
      window.removeEventListener('blur', release);
    };
  }, []);
  return held;
}
