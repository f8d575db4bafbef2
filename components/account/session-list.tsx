'use client';

import { useRouter } from 'next/navigation';
import { useState } from 'react';
import { Button } from '@/components/ui/button';
import { ConfirmDialog } from '@/components/ui/dialog';
import { Notice } from '@/components/ui/notice';
import { Skeleton } from '@/components/ui/skeleton';
import { Tag } from '@/components/ui/tag';
import { useToast } from '@/components/ui/toast';
import { sentenceOf } from '@/lib/client/api-error';
import { useEndSession, useSessions, useSignOutEverywhere } from '@/lib/client/use-account';
import { useForgetAccount } from '@/lib/client/use-me';
import type { AccountSession } from '@/lib/contracts/account';
import { deviceWords } from './device-words';
import { SinceTime } from '@/components/ui/since-time';

/** The devices on which the account is signed in, and the ways to end that. */
export function SessionList() {
  const sessions = useSessions();
  if (sessions.isPending) return <Skeleton className="h-28" />;
  if (sessions.isError) {
    return (
      <Notice kind="error" actions={<Button onClick={() => void sessions.refetch()}>Try again</Button>}>
        {sentenceOf(sessions.error)}
      </Notice>
    );
  }
  return (
    <div className="grid gap-4">
      <ul className="border-t border-rule">
        {sessions.data.items.map((session) => (
          <SessionRow key={session.id} session={session} />
        ))}
      </ul>
      <SignOutEverywhere />
    </div>
  );
}

function SessionRow({ session }: { session: AccountSession }) {
  const device = deviceWords(session.device);
  const end = useEndSession();
  const toast = useToast();
  const signOut = () =>
    end.mutate(session.id, {
      onSuccess: () => toast({ kind: 'ok', text: `Signed out: ${device}.` }),
      onError: (error) => toast({ kind: 'error', text: sentenceOf(error) }),
    });
  return (
    <li className="flex flex-wrap items-center gap-x-4 gap-y-1 border-b border-rule py-2.5">
      <div className="grow">
        <p className="flex flex-wrap items-center gap-2 font-medium">
          {device}
          {session.current ? (
            <Tag tone="ok" icon="check">
              this one
            </Tag>
          ) : null}
        </p>
        <p className="text-sm text-graphite">
          last used <SinceTime moment={session.lastSeenAt} />, signed in{' '}
          <SinceTime moment={session.createdAt} />
        </p>
      </div>
      {session.current ? null : (
        <Button size="small" busy={end.isPending} onClick={signOut} aria-label={`Sign out ${device}`}>
          Sign out
        </Button>
      )}
    </li>
  );
}

function SignOutEverywhere() {
  const [asking, setAsking] = useState(false);
  const everywhere = useSignOutEverywhere();
  const forget = useForgetAccount();
  const router = useRouter();
  const toast = useToast();
  const signOut = () =>
    everywhere.mutate(undefined, {
      onSuccess: () => {
        forget();
        router.replace('/sign-in?ended');
        router.refresh();
      },
      onError: (error) => toast({ kind: 'error', text: sentenceOf(error) }),
    });
  return (
    <>
      <Button
        icon="out"
        className="justify-self-start"
        busy={everywhere.isPending}
        onClick={() => setAsking(true)}
      >
        Sign out everywhere
      </Button>
      <ConfirmDialog
        open={asking}
        onOpenChange={setAsking}
        danger
        title="Sign out everywhere?"
        description="Every device is signed out at once, this one too. What is not saved yet stays on the device where it was drawn."
        confirm="Sign out everywhere"
        onConfirm={signOut}
      />
    </>
  );
}
