'use client';

import { useRouter } from 'next/navigation';
import { useState } from 'react';
import { Button } from '@/components/ui/button';
import { Notice } from '@/components/ui/notice';
import { useSignIn } from '@/lib/client/use-sign-in';

/** Signs in as the demo's maker and opens the projects. */
export function OpenDemo({ email, password }: { email: string; password: string }) {
  const router = useRouter();
  const signIn = useSignIn();
  const [leaving, setLeaving] = useState(false);

  function open() {
    signIn.mutate(
      { email, password },
      {
        onSuccess: () => {
          setLeaving(true);
          router.push('/projects');
        },
      },
    );
  }

  return (
    <>
      <Button variant="tab" size="large" busy={signIn.isPending || leaving} onClick={open}>
        Open the demo
      </Button>
      {signIn.error ? (
        <Notice kind="error" className="w-full">
          {signIn.error.message}
        </Notice>
      ) : null}
    </>
  );
}
