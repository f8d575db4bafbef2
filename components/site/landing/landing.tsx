import Link from 'next/link';
import { Button } from '@/components/ui/button';
import { AtTheMachine } from './at-the-machine';
import { OpenDemo } from './open-demo';
import { Promises } from './promises';
import { RailDrawing } from './rail-drawing';

interface LandingProps {
  readonly demo: { readonly email: string; readonly password: string } | null;
}

/** What it is for, in one glance: a board, both faces, the section, and the way in. */
export function Landing({ demo }: LandingProps) {
  return (
    <main id="main" className="mx-auto max-w-[90rem] px-4 py-5 sm:px-8 sm:py-8">
      <div className="border-2 border-ink bg-sheet">
        <div className="grid gap-x-12 gap-y-8 p-5 sm:p-8 lg:grid-cols-[minmax(20rem,5fr)_8fr] lg:p-10">
          <div className="grid content-center gap-5">
            <h1 className="text-3xl sm:text-4xl">
              Cut both faces of a board, and know it will come out right
            </h1>
            <p className="text-lg text-pretty text-graphite">
              For makers with a CNC router. Draw or bring an outline, say what is cut on face A and on face B,
              and see the wood that is left between. Every program is read back and tried on a model of the
              board before you cut.
            </p>
            <div className="flex flex-wrap gap-3">
              {demo ? <OpenDemo {...demo} /> : null}
              <Button size="large" variant={demo ? 'plain' : 'primary'} asChild>
                <Link href="/sign-up">Make an account</Link>
              </Button>
            </div>
            {demo ? <DemoAccountNote {...demo} /> : null}
          </div>
          <RailDrawing />
        </div>
        <TitleBlock />
      </div>
      <Promises />
      <AtTheMachine />
      <Caution />
    </main>
  );
}

function DemoAccountNote({ email, password }: { email: string; password: string }) {
  return (
    <p className="text-sm text-graphite">
      The demo signs in as <span className="figure text-ink">{email}</span> with the password{' '}
      <span className="figure text-ink">{password}</span>.
    </p>
  );
}

const cells = [
  ['Part', 'Hallway rail'],
  ['Board', 'Ash, 480 × 140 × 19 mm'],
  ['Face A', 'Leaves, chamfer, cut-out'],
  ['Face B', 'Groove, chamfer'],
  ['Tabs', '4, each 4.0 mm of wood'],
] as const;

/** The drawing's title block. */
function TitleBlock() {
  return (
    <dl className="grid grid-cols-2 border-t-2 border-ink sm:grid-cols-5">
      {cells.map(([name, value]) => (
        <div key={name} className="border-r border-b border-rule px-4 py-2.5 last:border-r-0 sm:border-b-0">
          <dt className="text-sm text-graphite">{name}</dt>
          <dd className="lettering text-lg">{value}</dd>
        </div>
      ))}
    </dl>
  );
}

function Caution() {
  return (
    <footer className="border-t border-rule pt-5 text-sm text-graphite">
      <p className="max-w-4xl text-pretty">
        A router can maim, and wood dust harms. Wear eye, ear and breathing protection, hold the work, keep
        hands away, try a program above the work first and know where the emergency stop is. The machine
        maker’s manual, local rules and trained people come first.
      </p>
    </footer>
  );
}
