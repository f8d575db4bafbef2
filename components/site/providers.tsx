'use client';

import { QueryClientProvider } from '@tanstack/react-query';
import { useState, type ReactNode } from 'react';
import { ThemeProvider } from '@/components/ui/theme';
import type { ThemeChoice } from '@/components/ui/theme-choice';
import { ToastProvider } from '@/components/ui/toast';
import { TooltipProvider } from '@/components/ui/tooltip';
import { createQueryClient } from '@/lib/client/query-client';

/** What every page may count on: server data, the theme, tooltips, notes. */
export function Providers({ theme, children }: { theme: ThemeChoice; children: ReactNode }) {
  const [queryClient] = useState(createQueryClient);
  return (
    <QueryClientProvider client={queryClient}>
      <ThemeProvider initial={theme}>
        <TooltipProvider delayDuration={400}>
          <ToastProvider>{children}</ToastProvider>
        </TooltipProvider>
      </ThemeProvider>
    </QueryClientProvider>
  );
}
