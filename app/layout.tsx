import type { Metadata, Viewport } from 'next';
import { cookies } from 'next/headers';
import type { ReactNode } from 'react';
import { Providers } from '@/components/site/providers';
import { THEME_COOKIE, themeChoiceOf } from '@/components/ui/theme-choice';
import './globals.css';

export const metadata: Metadata = {
  title: { default: 'Spindleaf', template: '%s · Spindleaf' },
  description: 'Plan, prove, review and cut wooden parts from both faces of a board on a CNC router.',
};

export const viewport: Viewport = {
  width: 'device-width',
  initialScale: 1,
  themeColor: [
    { media: '(prefers-color-scheme: light)', color: '#12455c' },
    { media: '(prefers-color-scheme: dark)', color: '#0e2f3f' },
  ],
};

export default async function RootLayout({ children }: { children: ReactNode }) {
  const theme = themeChoiceOf((await cookies()).get(THEME_COOKIE)?.value);
  return (
    <html lang="en" {...(theme === 'device' ? {} : { 'data-theme': theme })} suppressHydrationWarning>
      <body>
        <Providers theme={theme}>{children}</Providers>
      </body>
    </html>
  );
}
