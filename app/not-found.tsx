import Link from 'next/link';
import { AppHeader } from '@/components/site/app-header';
import { Button } from '@/components/ui/button';
import { NoPermissionState } from '@/components/ui/states';

export const metadata = { title: 'Not here' };

export default function NotFound() {
  return (
    <>
      <AppHeader />
      <main id="main">
        <NoPermissionState
          level={1}
          title="Not here, or not yours to open"
          actions={
            <Button variant="primary" asChild>
              <Link href="/projects">To the projects</Link>
            </Button>
          }
        >
          <p>Check the address, or ask the person who sent it to share the project with your account.</p>
        </NoPermissionState>
      </main>
    </>
  );
}
