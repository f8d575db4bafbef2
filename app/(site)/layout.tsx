import type { ReactNode } from 'react';
import { SiteHeader } from '@/components/site/app-header';
import { pagePrincipal } from '@/lib/server/auth/request-principal';

export default async function SiteLayout({ children }: { children: ReactNode }) {
  const signedIn = (await pagePrincipal()) !== null;
  return (
    <>
      <SiteHeader signedIn={signedIn} />
      {children}
    </>
  );
}
