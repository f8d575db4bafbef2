import { redirect } from 'next/navigation';
import { ProjectsPage } from '@/components/projects/projects-page';
import { AppHeader } from '@/components/site/app-header';
import { pagePrincipal } from '@/lib/server/auth/request-principal';

export const metadata = { title: 'Projects' };

export default async function Projects() {
  if (!(await pagePrincipal())) redirect('/sign-in?callbackUrl=/projects');
  return (
    <>
      <AppHeader />
      <ProjectsPage />
    </>
  );
}
