'use client';
export function StartFromFile(_: { onMade: (project: never) => void }) {
  return null;
}
