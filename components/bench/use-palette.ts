'use client';

import { useEffect, useState, type RefObject } from 'react';
import { readPalette, type Palette } from '@/components/canvas/palette';

/** The drawing's colours, read again when the theme changes, here or in the device's settings. */
export function usePalette(ref: RefObject<HTMLElement | null>): Palette | null {
  const [palette, setPalette] = useState<Palette | null>(null);
  useEffect(() => {
    const element = ref.current;
    if (!element) return;
    const read = (): void => setPalette(readPalette(element));
    read();
    const dark = window.matchMedia('(prefers-color-scheme: dark)');
    dark.addEventListener('change', read);
    const observer = new MutationObserver(read);
    observer.observe(document.documentElement, {
      attributes: true,
      attributeFilter: ['data-theme', 'class'],
    });
    return () => {
      dark.removeEventListener('change', read);
      observer.disconnect();
    };
  }, [ref]);
  return palette;
}
