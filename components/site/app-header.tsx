'use client';

import Link from 'next/link';
import { usePathname } from 'next/navigation';
import { classNames } from '@/components/ui/class-names';
import { HeaderBar } from '@/components/ui/header-bar';
import { Logo } from '@/components/ui/logo';
import { AccountMenu } from './account-menu';

const places = [{ href: '/projects', label: 'Projects' }] as const;

/** The header of the screens for people who are signed in, but for the bench, which fills the bar itself. */
export function AppHeader() {
  const path = usePathname();
  return (
    <>
      <SkipLink />
      <HeaderBar
        start={
          <>
            <HomeLink href="/projects" />
            <nav aria-label="Main" className="flex self-stretch">
              {places.map(({ href, label }) => {
                const here = path === href || path.startsWith(`${href}/`);
                return (
                  <Link
                    key={href}
                    href={href}
                    aria-current={here ? 'page' : undefined}
                    className={classNames(
                      'lettering ring-bar flex min-h-14 items-center border-b-4 px-3 text-lg',
                      here ? 'border-tab text-bar-on' : 'border-transparent text-bar-quiet hover:text-bar-on',
                    )}
                  >
                    {label}
                  </Link>
                );
              })}
            </nav>
          </>
        }
        end={<AccountMenu signedIn />}
      />
    </>
  );
}

/** The header of the public pages. `signedIn` is what the server found in the request. */
export function SiteHeader({ signedIn }: { signedIn: boolean }) {
  return (
    <>
      <SkipLink />
      <HeaderBar start={<HomeLink href="/" />} end={<AccountMenu signedIn={signedIn} />} />
    </>
  );
}

function HomeLink({ href }: { href: string }) {
  return (
    <Link href={href} className="ring-bar flex min-h-touch items-center gap-2.5" aria-label="Spindleaf, home">
      <Logo />
      <span className="hidden font-heading text-xl font-semibold sm:inline">Spindleaf</span>
    </Link>
  );
}

/** First stop of the Tab key. Pages give their `<main>` the id `main`. */
function SkipLink() {
  return (
    <a
      href="#main"
      className="sr-only z-50 rounded bg-sheet px-4 py-2 text-ink focus:not-sr-only focus:fixed focus:top-2 focus:left-2"
    >
      Skip to the content
    </a>
  );
}
