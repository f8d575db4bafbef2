import type { ReactNode } from 'react';

const promises = [
  {
    title: 'Plan and section, side by side',
    text: 'Drag a line across the plan and see the true section beneath it: both faces’ cuts, the wood left, the tabs.',
    drawing: (
      <>
        <path d="M12 10h136v34H12z" className="fill-none" />
        <path d="M4 27h152" strokeDasharray="12 3 2 3" />
        <path d="M12 62h44l8 12 8-12h76v28h-60v-9H74v9H12z" className="fill-wood-0" />
      </>
    ),
  },
  {
    title: 'Tabs that are proven to hold',
    text: 'Each tab states the wood that is really left once both faces are cut, and is raised clear of the other face’s chamfer.',
    drawing: (
      <>
        <path d="M8 24h50v66H34L8 90zM102 24h50v66H126l-24 0z" className="fill-wood-0" />
        <path d="M58 52h44v38l-22-20-22 20z" className="fill-tab" />
        <path d="M80 52v18" className="stroke-wood-2" strokeDasharray="3 2" />
      </>
    ),
  },
  {
    title: 'The program itself is tried',
    text: 'What you download is read back word by word, swept through a model of the board and compared with what you asked for.',
    drawing: (
      <>
        <path d="M14 12h58v76H14z" className="fill-none" />
        <path d="M22 26h34M22 38h42M22 50h28M22 62h40M22 74h20" />
        <path d="M80 50h18m-7-6l7 6-7 6" className="fill-none" />
        <path d="M106 38h44v26h-14l-8-12-8 12h-14z" className="fill-wood-0" />
      </>
    ),
  },
  {
    title: 'A second pair of eyes',
    text: 'Share a project; a reviewer sees both faces and pins a comment to a spot or a cut, without learning to draw.',
    drawing: (
      <>
        <path d="M12 56h136v34H12z" className="fill-wood-0" />
        <path d="M84 14h56v26h-28l-12 12v-12H84z" className="fill-sheet" />
        <path d="M93 23h38M93 31h24" />
        <circle cx="100" cy="66" r="5" className="fill-tab" />
      </>
    ),
  },
] as const satisfies readonly { title: string; text: string; drawing: ReactNode }[];

/** What sets it apart, each with a small drawing. */
export function Promises() {
  return (
    <section aria-label="What it does" className="grid gap-x-8 gap-y-8 py-10 sm:grid-cols-2 xl:grid-cols-4">
      {promises.map(({ title, text, drawing }) => (
        <div key={title} className="grid grid-cols-[7rem_1fr] gap-4 xl:grid-cols-1">
          <svg viewBox="0 0 160 100" className="w-full stroke-ink xl:w-40" strokeWidth="1.6" aria-hidden>
            {drawing}
          </svg>
          <div>
            <h2 className="text-xl">{title}</h2>
            <p className="text-pretty text-graphite">{text}</p>
          </div>
        </div>
      ))}
    </section>
  );
}
