import type { ReactNode } from 'react';
import { SiteHeader } from '@/components/site/app-header';

export default function AuthLayout({ children }: { children: ReactNode }) {
  return (
    <>
      <SiteHeader />
      <main id="main" className="grid justify-items-center px-4 py-10 sm:py-16">
        {children}
      </main>
    </>
  );
}
