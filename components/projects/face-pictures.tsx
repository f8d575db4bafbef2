'use client';

import { useState } from 'react';
import type { ProjectItem } from '@/lib/contracts/project';

type Face = 'A' | 'B';

/** Both faces of the board, one above the other as on a drawing, with the axis of the turn between them. */
export function FacePictures({ project }: { project: ProjectItem }) {
  return (
    <div className="grid gap-2 px-4 pt-4 pb-3">
      <FacePicture key={project.pictures.A} project={project} face="A" />
      <svg className="h-px w-full overflow-visible text-graphite" aria-hidden>
        <line x1="0" x2="100%" stroke="currentColor" strokeDasharray="14 4 3 4" />
      </svg>
      <FacePicture key={project.pictures.B} project={project} face="B" />
    </div>
  );
}

const letterColours: Record<Face, string> = { A: 'text-face-a', B: 'text-face-b' };

function FacePicture({ project, face }: { project: ProjectItem; face: Face }) {
  const [broken, setBroken] = useState(false);
  return (
    <div className="grid grid-cols-[1rem_1fr] items-center gap-2">
      <span aria-hidden className={`lettering font-semibold ${letterColours[face]}`}>
        {face}
      </span>
      <div className="grid h-28 place-items-center">
        {broken ? (
          <span className="text-sm text-graphite">No picture of face {face}</span>
        ) : (
          // A small SVG of our own server, cached for good by its address: nothing for an image optimiser to do.
          // eslint-disable-next-line @next/next/no-img-element
          <img
            src={project.pictures[face]}
            alt={`Face ${face} of ${project.name}`}
            loading="lazy"
            decoding="async"
            onError={() => setBroken(true)}
            className="max-h-28 max-w-full"
            style={{
              aspectRatio: `${project.board.x} / ${project.board.y}`,
              width: '100%',
              objectFit: 'contain',
            }}
          />
        )}
      </div>
    </div>
  );
}
