'use client';

import type { ReactNode } from 'react';
import { ErrorState } from '@/components/ui/states';
import { Skeleton } from '@/components/ui/skeleton';
import { sentenceOf } from '@/lib/client/api-error';
import { useMe } from '@/lib/client/use-me';
import { NameForm } from './name-form';
import { PasswordForm } from './password-form';
import { SessionList } from './session-list';

/** One's own account: name, password, and where one is signed in. */
export function AccountPage() {
  const me = useMe();
  if (me.isError) {
    return (
      <main id="main">
        <ErrorState level={1} title="The account could not be read" onRetry={() => void me.refetch()}>
          {sentenceOf(me.error)}
        </ErrorState>
      </main>
    );
  }
  return (
    <main id="main" className="mx-auto grid max-w-4xl gap-10 px-4 py-8 sm:px-8">
      <div>
        <h1 className="text-3xl">Account</h1>
        {me.data ? (
          <p className="figure text-graphite">{me.data.email}</p>
        ) : (
          <Skeleton className="mt-1 h-5 w-56" />
        )}
      </div>
      <Part title="Name" about="Others in a shared project see it beside your comments.">
        {me.data ? <NameForm key={me.data.id} name={me.data.name} /> : <Skeleton className="h-16" />}
      </Part>
      <Part title="Password" about="A new password signs out every other device.">
        <PasswordForm />
      </Part>
      <Part title="Where you are signed in" about="Sign out what you do not know, then change the password.">
        <SessionList />
      </Part>
    </main>
  );
}

function Part({ title, about, children }: { title: string; about: string; children: ReactNode }) {
  return (
    <section className="grid gap-x-10 gap-y-4 border-t border-rule pt-5 md:grid-cols-[14rem_1fr]">
      <div>
        <h2 className="text-xl">{title}</h2>
        <p className="text-pretty text-graphite">{about}</p>
      </div>
      <div>{children}</div>
    </section>
  );
}
