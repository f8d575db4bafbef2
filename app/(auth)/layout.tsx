import type { ReactNode } from 'react';
import { SiteHeader } from '@/components/site/app-header';
import { pagePrincipal } from '@/lib/server/auth/request-principal';

export default async function AuthLayout({ children }: { children: ReactNode }) {
  const signedIn = (await pagePrincipal()) !== null;
  return (
    <>
      <SiteHeader signedIn={signedIn} />
      <main id="main" className="grid justify-items-center px-4 py-10 sm:py-16">
        {children}
      </main>
    </>
  );
}
