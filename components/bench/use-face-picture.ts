'use client';

import { useEffect, useState } from 'react';
import type { FacePixels } from '@/lib/proof/face-picture';

/** A face's pixels as something a canvas can draw; null until they are there. */
export function useFacePicture(pixels: FacePixels | null): ImageBitmap | null {
  const [bitmap, setBitmap] = useState<ImageBitmap | null>(null);
  useEffect(() => {
    if (!pixels) return;
    let gone = false;
    void createImageBitmap(new ImageData(pixels.rgba, pixels.width, pixels.height)).then((made) => {
      if (gone) made.close();
      else setBitmap(made);
    });
    return () => {
      gone = true;
    };
  }, [pixels]);
  return pixels ? bitmap : null;
}
