'use client';

import { classNames } from '@/components/ui/class-names';
import { useBench, useEditorState } from './bench-context';

/** Turns the leaf: which face is seen from above. */
export function FaceSwitch() {
  const { editor } = useBench();
  const face = useEditorState(({ session }) => session.face);
  return (
    <div role="radiogroup" aria-label="Face that is up" className="flex shrink-0">
      {(['A', 'B'] as const).map((one) => (
        <button
          key={one}
          type="button"
          role="radio"
          aria-checked={face === one}
          onClick={() => editor.look({ face: one })}
          className={classNames(
            'lettering ring-bar min-h-9 px-3 text-lg touch:min-h-touch sm:px-5',
            face === one ? 'bg-sheet font-semibold' : 'text-bar-on hover:brightness-110',
            face === one
              ? one === 'A'
                ? 'text-face-a'
                : 'text-face-b'
              : one === 'A'
                ? 'bg-face-a-fill'
                : 'bg-face-b-fill',
            // The face that lies below is drawn as a leaf that is turned away.
            face !== one &&
              (one === 'A'
                ? '[clip-path:polygon(0_14%,100%_0,100%_100%,0_86%)]'
                : '[clip-path:polygon(0_0,100%_14%,100%_86%,0_100%)]'),
          )}
        >
          <span className="max-sm:sr-only">Face </span>
          {one}
        </button>
      ))}
    </div>
  );
}
