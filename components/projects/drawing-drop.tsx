'use client';

import { useId, useState, type DragEvent } from 'react';
import { classNames } from '@/components/ui/class-names';
import { Icon } from '@/components/ui/icon';

/** A place to drop a drawing file on, and the device's own way to choose one. */
export function DrawingDrop({ onFile }: { onFile: (file: File) => void }) {
  const id = useId();
  const [over, setOver] = useState(false);

  function drop(event: DragEvent) {
    event.preventDefault();
    setOver(false);
    const file = event.dataTransfer.files[0];
    if (file) onFile(file);
  }

  return (
    <div
      onDragOver={(event) => {
        event.preventDefault();
        setOver(true);
      }}
      onDragLeave={() => setOver(false)}
      onDrop={drop}
      className={classNames(
        'relative grid justify-items-center gap-2 border-2 border-dashed px-6 py-10 text-center',
        'focus-within:outline-2 focus-within:outline-offset-2 focus-within:outline-focus',
        over ? 'border-primary bg-select' : 'border-edge bg-well',
      )}
    >
      <Icon name="file" size={36} />
      <label htmlFor={id} className="cursor-pointer text-lg font-medium after:absolute after:inset-0">
        Choose an SVG file, or drop it here
      </label>
      <p className="text-graphite">Up to 10 MB. It is read on this device.</p>
      <input
        id={id}
        type="file"
        accept=".svg,image/svg+xml"
        className="sr-only"
        onChange={({ target }) => {
          const file = target.files?.[0];
          if (file) onFile(file);
          // The same file may be chosen again after it was mended.
          target.value = '';
        }}
      />
    </div>
  );
}
