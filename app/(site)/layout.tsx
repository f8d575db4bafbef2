import type { ReactNode } from 'react';
import { SiteHeader } from '@/components/site/app-header';

export default function SiteLayout({ children }: { children: ReactNode }) {
  return (
    <>
      <SiteHeader />
      {children}
    </>
  );
}
