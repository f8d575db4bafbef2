import { redirect } from 'next/navigation';
import { BenchLoader } from '@/components/bench/bench-loader';
import { pagePrincipal } from '@/lib/server/auth/request-principal';

export const metadata = { title: 'Bench' };

interface BenchPageProps {
  readonly params: Promise<{ id: string }>;
  readonly searchParams: Promise<{ comment?: string | string[] }>;
}

export default async function BenchPage({ params, searchParams }: BenchPageProps) {
  const { id } = await params;
  const { comment } = await searchParams;
  const threadId = typeof comment === 'string' ? comment : null;
  if (!(await pagePrincipal())) {
    const here = `/projects/${id}${threadId ? `?comment=${threadId}` : ''}`;
    redirect(`/sign-in?callbackUrl=${encodeURIComponent(here)}`);
  }
  return <BenchLoader projectId={id} comment={threadId} />;
}
