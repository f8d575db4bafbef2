const steps = [
  { face: 'B', name: 'Clamp, zero', note: 'B up, back edge', minutes: 3 },
  { face: 'B', name: 'Groove', note: '8 min · 6 mm flat', minutes: 8 },
  { face: 'B', name: 'Chamfer B', note: '2 min · 60° V-bit', minutes: 3 },
  { face: null, name: 'Turn over', note: 'the long way', minutes: 3 },
  { face: 'A', name: 'Leaves', note: '14 min · 60° V-bit', minutes: 9 },
  { face: 'A', name: 'Chamfer A', note: '2 min · 60° V-bit', minutes: 3 },
  { face: 'A', name: 'Cut-out', note: '9 min · 4 tabs', minutes: 7 },
] as const;

const edges = { A: 'border-face-a', B: 'border-face-b', turn: 'border-ink' } as const;

/** The rail's work in order, as wide as it takes time. */
export function AtTheMachine() {
  return (
    <section aria-labelledby="at-the-machine" className="grid gap-3 pb-10">
      <h2 id="at-the-machine" className="text-xl">
        At the machine, in this order
      </h2>
      <ol className="flex gap-1.5 overflow-x-auto pb-2" tabIndex={0} aria-labelledby="at-the-machine">
        {steps.map(({ face, name, note, minutes }) => (
          <li
            key={name}
            style={{ flexGrow: minutes, flexBasis: '8.5rem' }}
            className={`shrink-0 rounded-b border border-t-8 border-x-rule border-b-rule bg-sheet px-3 py-2.5 ${edges[face ?? 'turn']}`}
          >
            <p className="lettering text-lg">{name}</p>
            <p className="text-sm text-graphite">
              {face ? `Face ${face} · ` : null}
              {note}
            </p>
          </li>
        ))}
      </ol>
    </section>
  );
}
